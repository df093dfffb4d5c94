import { Module } from '@nestjs/common';
import { AccessModule } from '../access/access.module';
import { AuthModule } from '../auth/auth.module';
import { DatabaseNotices } from './database-notices';
import { EventStreams } from './event-streams';
import { EventsController } from './events.controller';
import { MeasurementStates } from './measurement-states';

@Module({
  imports: [AccessModule, AuthModule],
  controllers: [EventsController],
  providers: [DatabaseNotices, EventStreams, MeasurementStates],
})
export class EventsModule {}
