import { z } from 'zod';
import { commonFields, idSchema, instantSchema, textSchema } from './common-fields.js';

/** A photo (≤ 2 MiB after scaling) or a sound (≤ 10 MiB) of a reception; the bytes travel apart from the record. */
export const attachmentSchema = z.strictObject({
  ...commonFields,
  receptionId: idSchema,
  kind: z.enum(['photo', 'sound']),
  bytes: z
    .int()
    .min(1)
    .max(10 * 1024 * 1024),
  sha256: z.string().regex(/^[0-9a-f]{64}$/),
  takenAt: instantSchema.nullable(),
  caption: textSchema(200).nullable(),
});
export type Attachment = z.infer<typeof attachmentSchema>;
