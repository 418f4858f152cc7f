import { z } from 'zod';
import { idSchema } from './common-fields.js';
import { WRITABLE_TYPES } from './record-types.js';

/**
 * One replaced value of one field. `kept` won by its stamp, `replaced` stays readable and can be put back
 * by an ordinary edit. Rows marked `clash` (the writer had not seen the value it met) travel in the feed.
 */
export const historySchema = z.strictObject({
  deleted: z.boolean(),
  recordType: z.enum(WRITABLE_TYPES),
  recordId: idSchema,
  field: z.string().max(40),
  replaced: z.strictObject({ value: z.json(), stamp: z.string() }),
  kept: z.strictObject({ value: z.json(), stamp: z.string() }),
  byId: z.string(),
  clash: z.boolean(),
});
export type History = z.infer<typeof historySchema>;
