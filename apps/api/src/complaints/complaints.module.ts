import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module';
import { NotesModule } from '../notes/notes.module';
import { ThrottleModule } from '../throttle/throttle.module';
import { ComplaintsController } from './complaints.controller';
import { ComplaintsService } from './complaints.service';

@Module({
  imports: [AuditModule, NotesModule, ThrottleModule],
  controllers: [ComplaintsController],
  providers: [ComplaintsService],
})
export class ComplaintsModule {}
