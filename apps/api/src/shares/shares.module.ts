import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module';
import { AuthModule } from '../auth/auth.module';
import { ReportsModule } from '../reports/reports.module';
import { ThrottleModule } from '../throttle/throttle.module';
import { OpeningSharesService } from './opening-shares.service';
import { SharePreviewService } from './share-preview.service';
import { SharesController } from './shares.controller';
import { SharesService } from './shares.service';

@Module({
  imports: [AuditModule, AuthModule, ReportsModule, ThrottleModule],
  controllers: [SharesController],
  providers: [SharesService, OpeningSharesService, SharePreviewService],
  exports: [SharePreviewService],
})
export class SharesModule {}
