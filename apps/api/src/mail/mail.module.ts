import { Module } from '@nestjs/common';
import { QueueModule } from '../queue/queue.module';
import { ThrottleModule } from '../throttle/throttle.module';
import { MailChoicesController } from './mail-choices.controller';
import { MailChoicesService } from './mail-choices.service';
import { MailQueue } from './mail-queue';

/** The API's side of mail; the worker has `MailWorker`. */
@Module({
  imports: [QueueModule, ThrottleModule],
  controllers: [MailChoicesController],
  providers: [MailQueue, MailChoicesService],
  exports: [MailQueue],
})
export class MailModule {}
