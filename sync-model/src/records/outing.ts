import { z } from 'zod';
import { commonFields, idSchema, instantSchema, notesSchema } from './common-fields.js';

/** A jump of the device clock against the monotonic clock that was seen during the outing. */
export const clockStepSchema = z.strictObject({
  at: instantSchema,
  stepMs: z.int().min(-4_000_000_000_000).max(4_000_000_000_000),
});
export type ClockStep = z.infer<typeof clockStepSchema>;

export const outingSchema = z.strictObject({
  ...commonFields,
  siteId: idSchema,
  startedAt: instantSchema,
  ended: z.strictObject({ at: instantSchema, by: z.enum(['hand', 'gap', 'next']) }).nullable(),
  targetListId: idSchema.nullable(),
  setupIds: z.array(idSchema).min(1).max(6),
  currentSetupId: idSchema,
  eventId: idSchema.nullable(),
  clockSteps: z.array(clockStepSchema).max(200),
  notes: notesSchema,
});
export type Outing = z.infer<typeof outingSchema>;
