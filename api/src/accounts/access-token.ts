import { z } from 'zod';

/** The only way in which access tokens are signed; a token that names another is refused. */
export const ACCESS_ALGORITHM = 'HS256';
/** RFC 9068 section 2.1; keeps other tokens of the same issuer out. */
export const ACCESS_TYPE = 'at+jwt';
export const ACCESS_AUDIENCE = 'harkmoor-api';
export const ACCESS_ISSUER = 'harkmoor';
export const ACCESS_LIFE_S = 15 * 60;

export const accessPayloadSchema = z.object({
  sub: z.uuid(),
  sid: z.uuid(),
  exp: z.int(),
});
export type AccessPayload = z.infer<typeof accessPayloadSchema>;

/** What passport-jwt hands over when it is asked for the complete token. */
export const verifiedTokenSchema = z.object({
  header: z.object({ typ: z.literal(ACCESS_TYPE), alg: z.literal(ACCESS_ALGORITHM) }),
  payload: accessPayloadSchema,
});
