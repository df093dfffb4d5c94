import { Module } from '@nestjs/common';
import { RoomChangeSides } from './room-change-sides';
import { RoomComparisons } from './room-comparisons';
import { RoomLogController } from './room-log.controller';
import { RoomLogService } from './room-log.service';
import { RoomTrends } from './room-trends';
import { RoomUses } from './room-uses';
import { RoomsController } from './rooms.controller';
import { RoomsService } from './rooms.service';

@Module({
  controllers: [RoomsController, RoomLogController],
  providers: [RoomsService, RoomUses, RoomTrends, RoomLogService, RoomChangeSides, RoomComparisons],
})
export class RoomsModule {}
