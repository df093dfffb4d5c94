import { z } from 'zod';

export const progressFigures = ['level-spread', 'cymbals-over-drums', 'headroom'] as const;
export type ProgressFigure = (typeof progressFigures)[number];

/** What one take tells of the playing; null where the take can't tell it. */
const takeProgress = z.object({
  takeId: z.uuid(),
  number: z.int().positive(),
  title: z.string(),
  recordedAt: z.iso.datetime(),
  /** Distance between the quartiles of the kick file's peaks at kick hits, dB; of six hits and more. */
  levelSpreadDb: z.number().nonnegative().nullable(),
  /** Loudness of cymbals over that of drums in the overhead, dB. */
  cymbalsOverDrumsDb: z.number().nullable(),
  /** Of the hardest hit in the kick file under full scale, dB; null where it clipped. */
  headroomDb: z.number().nullable(),
  clipped: z.boolean(),
});
export type TakeProgress = z.infer<typeof takeProgress>;

/** The newest measured takes a person's progress is told from. */
export const maxProgressTakes = 1000;

/** Oldest first. */
export const progressResponse = z.object({ takes: z.array(takeProgress) });
export type ProgressResponse = z.infer<typeof progressResponse>;
