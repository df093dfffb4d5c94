import { eventsRequest } from '@thudline/contracts';
import { createZodDto } from 'nestjs-zod';

export class EventsDto extends createZodDto(eventsRequest) {}
