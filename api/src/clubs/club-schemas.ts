import { instantSchema, nameSchema } from '@harkmoor/sync-model/records/common-fields';
import { ROLES } from '@harkmoor/sync-model/records/member';
import { z } from 'zod';
import { joinCodeSchema } from './join-code.js';

const idSchema = z.uuid().toLowerCase();
const ituRegionSchema = z.literal([1, 2, 3]);

export const clubParamsSchema = z.strictObject({ clubId: idSchema });
export const memberParamsSchema = z.strictObject({ clubId: idSchema, accountId: idSchema });

export const foundSchema = z.strictObject({ name: nameSchema, ituRegion: ituRegionSchema });
export const joinSchema = z.strictObject({ code: joinCodeSchema });
export const newCodeSchema = z.strictObject({});
export const changeRoleSchema = z.strictObject({ role: z.enum(ROLES) });

export const clubAnswerSchema = z.strictObject({
  clubId: z.uuid(),
  role: z.enum(ROLES),
  card: z.strictObject({
    name: z.string(),
    kind: z.enum(['club', 'my-log']),
    ituRegion: ituRegionSchema,
    demo: z.boolean(),
  }),
});

export const joinCodeAnswerSchema = z.strictObject({
  code: z.string(),
  expiresAt: instantSchema,
  usesLeft: z.int(),
});

/** Names and roles; mail addresses are nobody else's. */
export const memberAnswerSchema = z.strictObject({
  accountId: z.uuid(),
  name: z.string(),
  role: z.enum(ROLES),
  joinedAt: instantSchema,
});
export const membersAnswerSchema = z.strictObject({ members: z.array(memberAnswerSchema) });
