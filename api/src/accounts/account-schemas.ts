import { nameSchema } from '@harkmoor/sync-model/records/common-fields';
import { ROLES } from '@harkmoor/sync-model/records/member';
import { DEVICE_ID_PATTERN } from '@harkmoor/sync-model/stamp/stamp';
import { z } from 'zod';

/** Kept and compared in lower case; 254 is the longest address that mail carries (RFC 5321 section 4.5.3.1.3). */
const emailSchema = z.string().max(254).trim().toLowerCase().pipe(z.email('must be a mail address'));

/** 10 to 128 characters in composed form (NFKC, so that each keyboard gives the same); no rule of composition. */
const passwordSchema = z
  .string()
  .max(512, 'must have at most 128 characters')
  .transform((text) => text.normalize('NFKC'))
  .refine((text) => [...text].length >= 10, 'must have at least 10 characters')
  .refine((text) => [...text].length <= 128, 'must have at most 128 characters');

/** At sign-in nothing is told about the rules. */
const typedPasswordSchema = z
  .string()
  .max(512)
  .transform((text) => text.normalize('NFKC'));

/** Tokens of our own are 43 characters of base64url. */
const tokenSchema = z.string().regex(/^[A-Za-z0-9_-]{43}$/, 'must be the token of a link');

export const signUpSchema = z.strictObject({
  name: nameSchema,
  email: emailSchema,
  password: passwordSchema,
});
export const confirmSchema = z.strictObject({ token: tokenSchema });
export const resetRequestSchema = z.strictObject({ email: emailSchema });
export const resetSchema = z.strictObject({ token: tokenSchema, password: passwordSchema });
export const signInSchema = z.strictObject({
  email: emailSchema,
  password: typedPasswordSchema,
  deviceId: z.string().regex(DEVICE_ID_PATTERN, 'must be 8 characters 0–9 a–z'),
  deviceName: nameSchema,
});
/** Routes that take nothing still take a JSON object: a foreign page cannot send one unasked. */
export const nothingSchema = z.strictObject({});

export const acceptedSchema = z.strictObject({ status: z.literal('accepted') });

const clubCardSchema = z.strictObject({
  name: z.string(),
  kind: z.enum(['club', 'my-log']),
  ituRegion: z.literal([1, 2, 3]),
  demo: z.boolean(),
});
const ownClubSchema = z.strictObject({ clubId: z.uuid(), role: z.enum(ROLES), card: clubCardSchema });
const ownAccountSchema = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  confirmed: z.boolean(),
});

export const whoAmISchema = z.strictObject({ account: ownAccountSchema, clubs: z.array(ownClubSchema) });
export const signedInSchema = whoAmISchema.extend({ accessToken: z.string() });

export type WhoAmI = z.infer<typeof whoAmISchema>;
