import { z } from 'zod';

const part = z.enum(['up', 'down']);

export const healthResponse = z.object({
  status: z.enum(['ok', 'failing']),
  database: part,
  objectStore: part,
  queue: part,
});
export type HealthResponse = z.infer<typeof healthResponse>;
