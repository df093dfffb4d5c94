import { Module } from '@nestjs/common';
import { NotesModule } from '../notes/notes.module';
import { ThrottleModule } from '../throttle/throttle.module';
import { ComplaintsController } from './complaints.controller';
import { ComplaintsService } from './complaints.service';

@Module({
  imports: [NotesModule, ThrottleModule],
  controllers: [ComplaintsController],
  providers: [ComplaintsService],
})
export class ComplaintsModule {}
