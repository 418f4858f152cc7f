import { z } from 'zod';
import { commonFields, instantSchema } from './common-fields.js';

export const deviceIdSchema = z.string().regex(/^[0-9a-z]{8}$/);

/** The device clock against a time signal: `offsetMs` = true − device. */
export const clockCheckSchema = z.strictObject({
  ...commonFields,
  deviceId: deviceIdSchema,
  deviceAt: instantSchema,
  offsetMs: z.int().min(-4_000_000_000_000).max(4_000_000_000_000),
  uncertaintyMs: z.int().min(0).max(86_400_000),
  method: z.enum(['tone', 'server', 'other']),
  pathKm: z.number().min(0).max(40_100).nullable(),
});
export type ClockCheck = z.infer<typeof clockCheckSchema>;
