import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module';
import { AuthModule } from '../auth/auth.module';
import { MailModule } from '../mail/mail.module';
import { ReportsModule } from '../reports/reports.module';
import { DeletionController } from './deletion.controller';
import { DeletionService } from './deletion.service';
import { MeController } from './me.controller';
import { MeService } from './me.service';
import { MySessionsController } from './my-sessions.controller';

@Module({
  imports: [AuditModule, AuthModule, MailModule, ReportsModule],
  controllers: [MeController, MySessionsController, DeletionController],
  providers: [MeService, DeletionService],
})
export class UsersModule {}
