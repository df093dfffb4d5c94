import { Module } from '@nestjs/common';
import { QueueModule } from '../queue/queue.module';
import { MailQueue } from './mail-queue';

/** The API's side of mail; the worker has `MailWorker`. */
@Module({ imports: [QueueModule], providers: [MailQueue], exports: [MailQueue] })
export class MailModule {}
