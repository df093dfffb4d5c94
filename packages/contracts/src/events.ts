import { z } from 'zod';
import { measurementResponse } from './takes';

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
export const eventNames = { measurement: 'measurement', takeAdded: 'take-added' } as const;
