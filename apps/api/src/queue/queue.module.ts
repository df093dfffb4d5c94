import { Module } from '@nestjs/common';
import { QueueSender } from './queue-sender';

@Module({ providers: [QueueSender], exports: [QueueSender] })
export class QueueModule {}
