import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module';
import { MeasurementsModule } from '../measuring/measurements.module';
import { ReportsModule } from '../reports/reports.module';
import { SettingsModule } from '../settings/settings.module';
import { StorageModule } from '../storage/storage.module';
import { SameFilesService } from './same-files.service';
import { TakeCreationService } from './take-creation.service';
import { TakeListsService } from './take-lists.service';
import { TakesController } from './takes.controller';
import { TakesService } from './takes.service';
import { UploadQuota } from './upload/upload-quota';
import { TakeUploadsService } from './upload/take-uploads.service';

@Module({
  imports: [AuditModule, MeasurementsModule, ReportsModule, SettingsModule, StorageModule],
  controllers: [TakesController],
  providers: [
    TakesService,
    SameFilesService,
    TakeListsService,
    TakeCreationService,
    TakeUploadsService,
    UploadQuota,
  ],
})
export class TakesModule {}
