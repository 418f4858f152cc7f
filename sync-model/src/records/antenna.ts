import { z } from 'zod';
import {
  azimuthDegSchema,
  commonFields,
  idSchema,
  instantSchema,
  nameSchema,
  notesSchema,
} from './common-fields.js';

export const ANTENNA_KINDS = [
  'whip',
  'wire',
  'dipole',
  'vertical',
  'ferrite',
  'loop',
  'active',
  'beam',
  'other',
] as const;

export const antennaSchema = z.strictObject({
  ...commonFields,
  name: nameSchema,
  kind: z.enum(ANTENNA_KINDS),
  lengthM: z.number().min(0.01).max(5000).nullable(),
  heightM: z.number().min(0).max(300).nullable(),
  azimuthDeg: azimuthDegSchema.nullable(),
  gainDb: z.number().min(-40).max(40).nullable(),
  sharedUse: z.boolean(),
  replaces: idSchema.nullable(),
  notes: notesSchema,
  retiredAt: instantSchema.nullable(),
});
export type Antenna = z.infer<typeof antennaSchema>;
