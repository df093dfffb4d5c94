import { Module } from '@nestjs/common';
import { AddedFilesModule } from '../added-files/added-files.module';
import { AuditModule } from '../audit/audit.module';
import { ExportsModule } from '../exports/exports.module';
import { MailModule } from '../mail/mail.module';
import { MeasurementsModule } from '../measuring/measurements.module';
import { SettingsModule } from '../settings/settings.module';
import { ThrottleModule } from '../throttle/throttle.module';
import { AdminAccountsController } from './admin-accounts.controller';
import { AdminAccountsService } from './admin-accounts.service';
import { AdminAuditController } from './admin-audit.controller';
import { AdminAuditService } from './admin-audit.service';
import { AdminSettingsController } from './admin-settings.controller';
import { AdminWorkController } from './admin-work.controller';
import { AdminWorkService } from './admin-work.service';

@Module({
  imports: [
    AddedFilesModule,
    AuditModule,
    ExportsModule,
    MailModule,
    MeasurementsModule,
    SettingsModule,
    ThrottleModule,
  ],
  controllers: [AdminAccountsController, AdminWorkController, AdminAuditController, AdminSettingsController],
  providers: [AdminAccountsService, AdminWorkService, AdminAuditService],
})
export class AdminModule {}
