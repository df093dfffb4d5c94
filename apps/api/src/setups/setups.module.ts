import { Module } from '@nestjs/common';
import { PhotosModule } from '../photos/photos.module';
import { SetupUses } from './setup-use';
import { SetupsController } from './setups.controller';
import { SetupsService } from './setups.service';

@Module({
  imports: [PhotosModule],
  controllers: [SetupsController],
  providers: [SetupsService, SetupUses],
})
export class SetupsModule {}
