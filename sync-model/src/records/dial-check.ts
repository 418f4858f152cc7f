import { z } from 'zod';
import { commonFields, frequencyHzSchema, idSchema, instantSchema } from './common-fields.js';

/** The dial against a carrier of known frequency: errorPpm = (dial − true) / true × 10⁶. */
export const dialCheckSchema = z.strictObject({
  ...commonFields,
  receiverId: idSchema,
  at: instantSchema,
  referenceHz: frequencyHzSchema,
  dialHz: frequencyHzSchema,
  errorPpm: z.number().min(-100_000).max(100_000),
  uncertaintyPpm: z.number().min(0).max(100_000),
  method: z.enum(['zero-beat', 'beat-note', 'count']),
  temperatureC: z.number().min(-60).max(80).nullable(),
});
export type DialCheck = z.infer<typeof dialCheckSchema>;
