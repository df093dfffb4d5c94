import { Module } from '@nestjs/common';
import { MeasurementsModule } from '../measuring/measurements.module';
import { StorageModule } from '../storage/storage.module';
import { HealthController } from './health.controller';

@Module({ imports: [MeasurementsModule, StorageModule], controllers: [HealthController] })
export class HealthModule {}
