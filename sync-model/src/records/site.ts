import { z } from 'zod';
import {
  commonFields,
  instantSchema,
  latDegSchema,
  lonDegSchema,
  nameSchema,
  notesSchema,
} from './common-fields.js';

export const ENVIRONMENTS = ['city', 'residential', 'rural', 'quiet-rural'] as const;

/** What others see of a place: a locator square, or the exact point where the owner has said so. */
export const placeSchema = z.union([
  z.strictObject({
    locator: z
      .string()
      .regex(/^[A-R]{2}[0-9]{2}([a-x]{2}([0-9]{2})?)?$/, 'must be a locator of 4, 6 or 8 characters'),
  }),
  z.strictObject({ latDeg: latDegSchema, lonDeg: lonDegSchema }),
]);
export type Place = z.infer<typeof placeSchema>;

/** A named place as the club knows it; the exact fix is a `site-fix` in the owner's My log. */
export const siteSchema = z.strictObject({
  ...commonFields,
  name: nameSchema,
  place: placeSchema,
  environment: z.enum(ENVIRONMENTS),
  sharedUse: z.boolean(),
  notes: notesSchema,
  retiredAt: instantSchema.nullable(),
});
export type Site = z.infer<typeof siteSchema>;
