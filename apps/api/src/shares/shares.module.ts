import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module';
import { ReportsModule } from '../reports/reports.module';
import { ThrottleModule } from '../throttle/throttle.module';
import { SharePreviewService } from './share-preview.service';
import { SharesController } from './shares.controller';
import { SharesService } from './shares.service';
import { TakeSharesController } from './take-shares.controller';

@Module({
  imports: [AuditModule, ReportsModule, ThrottleModule],
  controllers: [SharesController, TakeSharesController],
  providers: [SharesService, SharePreviewService],
  exports: [SharePreviewService],
})
export class SharesModule {}
