import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module';
import { AuthModule } from '../auth/auth.module';
import { ComparisonsModule } from '../comparisons/comparisons.module';
import { MailModule } from '../mail/mail.module';
import { ReportsModule } from '../reports/reports.module';
import { RoomsModule } from '../rooms/rooms.module';
import { ThrottleModule } from '../throttle/throttle.module';
import { TryOutsModule } from '../tryouts/try-outs.module';
import { OpeningSharesService } from './opening-shares.service';
import { SharePreviewService } from './share-preview.service';
import { SharesController } from './shares.controller';
import { SharesService } from './shares.service';

@Module({
  imports: [
    AuditModule,
    AuthModule,
    ComparisonsModule,
    MailModule,
    ReportsModule,
    RoomsModule,
    ThrottleModule,
    TryOutsModule,
  ],
  controllers: [SharesController],
  providers: [SharesService, OpeningSharesService, SharePreviewService],
  exports: [SharePreviewService],
})
export class SharesModule {}
