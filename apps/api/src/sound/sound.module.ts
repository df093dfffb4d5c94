import { Module } from '@nestjs/common';
import { StorageModule } from '../storage/storage.module';
import { PeaksController } from './peaks.controller';
import { SoundController } from './sound.controller';
import { TakePeaksService } from './take-peaks.service';
import { TakeSoundService } from './take-sound.service';

@Module({
  imports: [StorageModule],
  controllers: [SoundController, PeaksController],
  providers: [TakeSoundService, TakePeaksService],
})
export class SoundModule {}
