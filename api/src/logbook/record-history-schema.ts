import { z } from 'zod';
import { stampSchema } from '@harkmoor/sync-model/protocol/message-schemas';
import { idSchema } from '@harkmoor/sync-model/records/common-fields';
import { WRITABLE_TYPES } from '@harkmoor/sync-model/records/record-types';

export const recordPathSchema = z.strictObject({
  clubId: idSchema,
  type: z.enum(WRITABLE_TYPES),
  id: idSchema,
});
export type RecordPath = z.infer<typeof recordPathSchema>;

const registerSchema = z.strictObject({ value: z.unknown(), stamp: stampSchema });

export const recordHistorySchema = z.strictObject({
  /** Newest first. */
  rows: z.array(
    z.strictObject({
      id: z.string(),
      field: z.string(),
      replaced: registerSchema,
      kept: registerSchema,
      byId: z.string(),
      clash: z.boolean(),
      at: z.int(),
    }),
  ),
});
export type RecordHistoryAnswer = z.infer<typeof recordHistorySchema>;
