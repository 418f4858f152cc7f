import { z } from 'zod';
import {
  commonFields,
  frequencyHzSchema,
  idSchema,
  instantSchema,
  latDegSchema,
  lonDegSchema,
  modeSchema,
  textSchema,
} from './common-fields.js';

const timeOfDaySchema = z.string().regex(/^([01][0-9]|2[0-3]):[0-5][0-9]$/, 'must be a UTC time HH:MM');

/** `to` ≤ `from` crosses midnight and belongs to the UTC day of its start; days are ISO weekdays, 1 Monday to 7 Sunday. */
export const scheduleSlotSchema = z.strictObject({
  from: timeOfDaySchema,
  to: timeOfDaySchema,
  days: z.array(z.int().min(1).max(7)).min(1).max(7),
  validFrom: instantSchema.optional(),
  validTo: instantSchema.optional(),
});
export type ScheduleSlot = z.infer<typeof scheduleSlotSchema>;

export const scheduleSchema = z.union([z.literal('always'), z.array(scheduleSlotSchema).min(1).max(20)]);
export type Schedule = z.infer<typeof scheduleSchema>;

export const targetSchema = z.strictObject({
  ...commonFields,
  listId: idSchema,
  name: textSchema(80).refine((text) => text.trim().length > 0, 'must not be empty'),
  frequencyHz: frequencyHzSchema,
  mode: modeSchema,
  schedule: scheduleSchema,
  silences: z
    .array(
      z
        .strictObject({ from: instantSchema, to: instantSchema })
        .refine(({ from, to }) => from < to, 'a silence must end after it starts'),
    )
    .max(100),
  tx: z.strictObject({ latDeg: latDegSchema, lonDeg: lonDegSchema }).nullable(),
  powerKw: z.number().min(0).max(5000).nullable(),
  language: textSchema(40).nullable(),
  note: textSchema(4000).nullable(),
});
export type Target = z.infer<typeof targetSchema>;
