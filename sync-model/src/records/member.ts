import { z } from 'zod';
import { instantSchema, nameSchema } from './common-fields.js';

export const ROLES = ['member', 'organizer', 'admin'] as const;
export type Role = (typeof ROLES)[number];

/** One person's place in a club; the record's id is the account's. Written by the server, pulled read-only. */
export const memberSchema = z.strictObject({
  deleted: z.boolean(),
  name: nameSchema,
  role: z.enum(ROLES),
  joinedAt: instantSchema,
  leftAt: instantSchema.nullable(),
});
export type Member = z.infer<typeof memberSchema>;
