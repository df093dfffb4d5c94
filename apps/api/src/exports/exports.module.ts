import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module';
import { QueueModule } from '../queue/queue.module';
import { StorageModule } from '../storage/storage.module';
import { ExportQueue } from './export-queue';
import { ExportsController } from './exports.controller';
import { ExportsService } from './exports.service';

@Module({
  imports: [AuditModule, QueueModule, StorageModule],
  controllers: [ExportsController],
  providers: [ExportsService, ExportQueue],
  exports: [ExportQueue],
})
export class ExportsModule {}
