import { Module } from '@nestjs/common';
import { QueueModule } from '../queue/queue.module';
import { MeasureQueue } from './measure-queue';
import { MeasurementsController } from './measurements.controller';
import { MeasurementsService } from './measurements.service';
import { SheetVersionsService } from './sheet-versions.service';

@Module({
  imports: [QueueModule],
  controllers: [MeasurementsController],
  providers: [MeasureQueue, MeasurementsService, SheetVersionsService],
  exports: [MeasureQueue, MeasurementsService, SheetVersionsService],
})
export class MeasurementsModule {}
