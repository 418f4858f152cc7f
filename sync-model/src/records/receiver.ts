import { z } from 'zod';
import {
  commonFields,
  frequencyHzSchema,
  idSchema,
  instantSchema,
  nameSchema,
  notesSchema,
} from './common-fields.js';

export const METER_KINDS = ['s', 'dbm', 'none'] as const;

export const meterScaleSchema = z.strictObject({
  kind: z.enum(METER_KINDS),
  /** The level that this meter calls S9 below 30 MHz; IARU R1 R.1: −73 dBm (−93 dBm above 30 MHz). */
  s9Dbm: z.number().min(-110).max(-40),
  dbPerS: z.number().min(3).max(10),
  calibrated: z.boolean(),
});
export type MeterScale = z.infer<typeof meterScaleSchema>;

export const receiverSchema = z.strictObject({
  ...commonFields,
  name: nameSchema,
  ranges: z
    .array(
      z
        .strictObject({ lowHz: z.int().min(0).max(3_000_000_000), highHz: frequencyHzSchema })
        .refine(({ lowHz, highHz }) => lowHz < highHz, 'the lower end must be below the upper'),
    )
    .max(10),
  meterScale: meterScaleSchema,
  ifHz: z.array(frequencyHzSchema).max(3).nullable(),
  bandwidthsHz: z.array(z.int().min(10).max(1_000_000)).max(12).nullable(),
  supplyMa: z.number().min(0.1).max(5000).nullable(),
  batteryMah: z.number().min(1).max(1_000_000).nullable(),
  dialStepHz: z.int().min(1).max(1_000_000).nullable(),
  sharedUse: z.boolean(),
  replaces: idSchema.nullable(),
  notes: notesSchema,
  retiredAt: instantSchema.nullable(),
});
export type Receiver = z.infer<typeof receiverSchema>;
