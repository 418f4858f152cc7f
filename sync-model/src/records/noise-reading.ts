import { z } from 'zod';
import {
  commonFields,
  frequencyHzSchema,
  idSchema,
  instantSchema,
  meterReadingSchema,
} from './common-fields.js';

export const noiseReadingSchema = z.strictObject({
  ...commonFields,
  siteId: idSchema,
  setupId: idSchema,
  at: instantSchema,
  dialHz: frequencyHzSchema,
  bandwidthHz: z.int().min(1).max(10_000_000),
  meter: meterReadingSchema,
});
export type NoiseReading = z.infer<typeof noiseReadingSchema>;
