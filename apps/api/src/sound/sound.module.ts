import { Module } from '@nestjs/common';
import { StorageModule } from '../storage/storage.module';
import { SoundController } from './sound.controller';
import { TakeSoundService } from './take-sound.service';

@Module({ imports: [StorageModule], controllers: [SoundController], providers: [TakeSoundService] })
export class SoundModule {}
