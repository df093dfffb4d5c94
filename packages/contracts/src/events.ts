import { z } from 'zod';
import { measurementResponse } from './takes';

/** `takes`: ids of the takes a tab shows, with commas between; none for a tab that only waits for new takes. */
export const eventsRequest = z.object({
  takes: z
    .string()
    .default('')
    .transform((text) => text.split(',').filter(Boolean))
    .pipe(z.array(z.uuid()).max(100, 'A stream tells of at most 100 takes.')),
});
export type EventsRequest = z.infer<typeof eventsRequest>;

/** One take's measurement as it is now; the first events of a connection tell the full state. */
export const measurementEvent = z.object({
  takeId: z.uuid(),
  measurement: measurementResponse,
  hasReport: z.boolean(),
});
export type MeasurementEvent = z.infer<typeof measurementEvent>;

/** A take was added, so lists and Big print have something new to show. */
export const takeAddedEvent = z.object({ takeId: z.uuid(), followsTakeId: z.uuid().nullable() });
export type TakeAddedEvent = z.infer<typeof takeAddedEvent>;

/** Names of the server-sent events of `GET /api/events`. */
export const eventNames = { measurement: 'measurement', takeAdded: 'take-added', notes: 'notes' } as const;
