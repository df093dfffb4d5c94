import { Module } from '@nestjs/common';
import { QueueModule } from '../queue/queue.module';
import { MeasureQueue } from './measure-queue';
import { MeasurementsController } from './measurements.controller';
import { MeasurementsService } from './measurements.service';

@Module({
  imports: [QueueModule],
  controllers: [MeasurementsController],
  providers: [MeasureQueue, MeasurementsService],
  exports: [MeasureQueue, MeasurementsService],
})
export class MeasurementsModule {}
