import { z } from 'zod';
import {
  commonFields,
  frequencyHzSchema,
  idSchema,
  instantSchema,
  meterReadingSchema,
  modeSchema,
  textSchema,
} from './common-fields.js';

export const OUTCOMES = ['heard', 'nil', 'skipped'] as const;
export const BASES = ['round', 'planned', 'chance', 'swap', 'import'] as const;
export const IDENTITIES = ['sure', 'tentative', 'unknown'] as const;
export const NIL_REASONS = ['nothing', 'covered', 'noise', 'fault'] as const;
/** Fields that *Same again* takes over; they count only once touched. */
export const CARRIED_FIELDS = [
  'sinpo',
  'rst',
  'meter',
  'noiseMeter',
  'tuning',
  'bandwidthHz',
  'attenuationDb',
] as const;

const gradeSchema = z.union([
  z.literal(1),
  z.literal(2),
  z.literal(3),
  z.literal(4),
  z.literal(5),
  z.literal('X'),
]);

/** ITU-R SM.1135: strength, interference, noise, propagation disturbance, overall; X where not judged. */
export const sinpoSchema = z.strictObject({
  s: gradeSchema,
  i: gradeSchema,
  n: gradeSchema,
  p: gradeSchema,
  o: gradeSchema,
});
export type Sinpo = z.infer<typeof sinpoSchema>;

export const rstSchema = z.strictObject({
  r: z.int().min(1).max(5),
  s: z.int().min(1).max(9),
  t: z.int().min(1).max(9).optional(),
});
export type Rst = z.infer<typeof rstSchema>;

export const programmeDetailSchema = z.strictObject({ at: instantSchema, text: textSchema(300) });
export type ProgrammeDetail = z.infer<typeof programmeDetailSchema>;

export const receptionSchema = z.strictObject({
  ...commonFields,
  outingId: idSchema.nullable(),
  siteId: idSchema,
  setupId: idSchema,
  targetId: idSchema.nullable(),
  /** The target's frequency as it was at the entry. */
  targetHz: frequencyHzSchema.nullable(),
  eventId: idSchema.nullable(),
  swap: z
    .strictObject({
      testId: idSchema,
      pairNo: z.int().min(1).max(60),
      arm: z.int().min(0).max(3),
      order: z.int().min(1).max(4),
      spoilt: z.boolean().optional(),
    })
    .nullable(),
  roundNo: z.int().min(1).max(999).nullable(),
  outcome: z.enum(OUTCOMES),
  basis: z.enum(BASES),
  identity: z.enum(IDENTITIES),
  nilReason: z.enum(NIL_REASONS).nullable(),
  /** The device clock at the tap; never corrected in place. */
  deviceAt: instantSchema,
  durationS: z.number().min(0).max(14_400).nullable(),
  tuning: z.strictObject({ dialHz: frequencyHzSchema, mode: modeSchema }),
  bandwidthHz: z.int().min(1).max(10_000_000).nullable(),
  attenuationDb: z.number().min(0).max(80).nullable(),
  sinpo: sinpoSchema.nullable(),
  rst: rstSchema.nullable(),
  meter: meterReadingSchema.nullable(),
  noiseMeter: meterReadingSchema.nullable(),
  carried: z.array(z.enum(CARRIED_FIELDS)).max(CARRIED_FIELDS.length).nullable(),
  programme: z.array(programmeDetailSchema).max(100).nullable(),
  remarks: textSchema(4000).nullable(),
  stationName: textSchema(80).nullable(),
  heardBy: textSchema(60).nullable(),
});
export type Reception = z.infer<typeof receptionSchema>;
