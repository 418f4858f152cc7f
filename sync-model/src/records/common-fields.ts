import { z } from 'zod';

/** Instants are integer milliseconds UTC, 1990-01-01 to 2100-01-01 (records.md). */
export const instantSchema = z
  .int()
  .min(Date.UTC(1990, 0, 1))
  .max(Date.UTC(2100, 0, 1));

export const idSchema = z
  .string()
  .regex(/^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);

const isNfc = (text: string) => text === text.normalize('NFC');
// eslint-disable-next-line no-control-regex -- control characters are what is refused here
const hasControlCharacters = (text: string) => /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/.test(text);

/** Half of a character outside the basic plane, as a cut through an emoji leaves it: no database stores it. */
const hasHalfCharacters = (text: string) => /\p{Surrogate}/u.test(text);

/** Text for people: whole characters, composed (NFC), without control characters other than tab and line ends. */
export function textSchema(lengthMax: number) {
  return z
    .string()
    .max(lengthMax)
    .refine(isNfc, 'must be composed text (NFC)')
    .refine((text) => !hasControlCharacters(text), 'must not hold control characters')
    .refine((text) => !hasHalfCharacters(text), 'must not hold half a character');
}

export const nameSchema = textSchema(60).refine((text) => text.trim().length > 0, 'must not be empty');
export const notesSchema = textSchema(4000).nullable();
export const frequencyHzSchema = z.int().min(1000).max(3_000_000_000);
export const latDegSchema = z.number().min(-90).max(90);
export const lonDegSchema = z.number().min(-180).max(180);
export const azimuthDegSchema = z.number().min(0).max(359);

export const MODES = ['AM', 'SAM', 'USB', 'LSB', 'DSB', 'CW', 'FM', 'digital', 'other'] as const;
export const modeSchema = z.enum(MODES);
export type Mode = z.infer<typeof modeSchema>;

/** Fields that every record of a club carries beside its own. */
export const commonFields = {
  deleted: z.boolean(),
  importId: idSchema.nullable(),
};

/** A meter reading as it was read: S-units with the dB above S9, or dBm. */
export const meterReadingSchema = z.union([
  z.strictObject({ s: z.int().min(0).max(9), overDb: z.number().min(0).max(80) }),
  z.strictObject({ dbm: z.number().min(-150).max(20) }),
]);
export type MeterReading = z.infer<typeof meterReadingSchema>;
