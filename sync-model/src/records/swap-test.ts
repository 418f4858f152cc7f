import { z } from 'zod';
import { commonFields, frequencyHzSchema, idSchema, instantSchema } from './common-fields.js';

export const SWAP_MEASURES = ['over-noise', 'level', 'score'] as const;

/** A guided paired comparison of antennas; `targetId` or `frequencyHz` names the signal. */
export const swapTestSchema = z.strictObject({
  ...commonFields,
  outingId: idSchema,
  setupIds: z.array(idSchema).min(2).max(4),
  targetId: idSchema.nullable(),
  frequencyHz: frequencyHzSchema.nullable(),
  measure: z.enum(SWAP_MEASURES),
  pairsPlanned: z.int().min(6).max(60),
  gapLimitS: z.int().min(10).max(120),
  dwellS: z.int().min(5).max(30),
  seed: z.int().min(0).max(4_294_967_295),
  ended: z.strictObject({ at: instantSchema, reason: z.enum(['done', 'stopped', 'conditions']) }).nullable(),
});
export type SwapTest = z.infer<typeof swapTestSchema>;
