import { z } from 'zod';

export const photoLimits = {
  maxBytes: 10 * 1024 * 1024,
  types: ['image/jpeg', 'image/png', 'image/webp'],
} as const;

/** A photo as it is kept: turned upright, at most 2048 px long, without what the camera wrote into it. */
export const photoResponse = z.object({
  id: z.uuid(),
  widthPx: z.int().positive(),
  heightPx: z.int().positive(),
});
export type PhotoResponse = z.infer<typeof photoResponse>;
