import { Module } from '@nestjs/common';
import { PhotosModule } from '../photos/photos.module';
import { StorageModule } from '../storage/storage.module';
import { RoomChangeSides } from './room-change-sides';
import { RoomComparisons } from './room-comparisons';
import { RoomFiles } from './room-files';
import { RoomLogController } from './room-log.controller';
import { RoomLogService } from './room-log.service';
import { RoomTrends } from './room-trends';
import { RoomUses } from './room-uses';
import { RoomsController } from './rooms.controller';
import { RoomsService } from './rooms.service';
import { SetupTrendsController } from './setup-trends.controller';

@Module({
  imports: [PhotosModule, StorageModule],
  controllers: [RoomsController, RoomLogController, SetupTrendsController],
  providers: [
    RoomsService,
    RoomUses,
    RoomTrends,
    RoomLogService,
    RoomChangeSides,
    RoomComparisons,
    RoomFiles,
  ],
  exports: [RoomLogService],
})
export class RoomsModule {}
