import { z } from 'zod';
import { commonFields, idSchema, instantSchema, textSchema } from './common-fields.js';

/** A receiver with an antenna, and what stands between them. */
export const setupSchema = z.strictObject({
  ...commonFields,
  receiverId: idSchema,
  antennaId: idSchema,
  coupling: textSchema(60).nullable(),
  attenuationDb: z.number().min(0).max(80),
  preampDb: z.number().min(0).max(40),
  retiredAt: instantSchema.nullable(),
});
export type Setup = z.infer<typeof setupSchema>;
