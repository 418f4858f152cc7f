import { z } from 'zod';
import { commonFields, instantSchema, nameSchema, textSchema } from './common-fields.js';

/** A draft until `publishedAt` is set; publishing is for organizers. */
export const targetListSchema = z.strictObject({
  ...commonFields,
  name: nameSchema,
  edition: textSchema(40).nullable(),
  validFrom: instantSchema.nullable(),
  validTo: instantSchema.nullable(),
  publishedAt: instantSchema.nullable(),
});
export type TargetList = z.infer<typeof targetListSchema>;
