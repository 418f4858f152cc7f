import { z } from 'zod';

/** All that a notice says. What is new in the club is asked for by a round. */
export const noticeSchema = z.strictObject({ clubId: z.uuid(), seq: z.int().min(0) });
export type Notice = z.infer<typeof noticeSchema>;

/** The notice in the payload that the database sends: a club's id, a space, its `seq`. */
export function parseNotice(payload: string): Notice {
  const [clubId, seq] = payload.split(' ');
  return noticeSchema.parse({ clubId, seq: Number(seq) });
}
