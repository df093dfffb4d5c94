import { Module } from '@nestjs/common';
import { MeasureQueue } from './measure-queue';
import { MeasurementsController } from './measurements.controller';
import { MeasurementsService } from './measurements.service';

@Module({
  controllers: [MeasurementsController],
  providers: [MeasureQueue, MeasurementsService],
  exports: [MeasureQueue, MeasurementsService],
})
export class MeasurementsModule {}
