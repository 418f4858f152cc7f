import { RECORD_SCHEMAS } from '@harkmoor/sync-model/records/schemas';
import { idSchema } from '@harkmoor/sync-model/records/common-fields';
import { WRITABLE_TYPES } from '@harkmoor/sync-model/records/record-types';
import { STAMP_PATTERN } from '@harkmoor/sync-model/stamp/stamp';
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { z } from 'zod';

/** A file is no more to be trusted than the wire: each record is held against its own schema before any is stored. */
const stampSchema = z.string().regex(STAMP_PATTERN);
const fieldName = z.string().regex(/^[a-z][A-Za-z]{0,39}$/);
const owedSchema = z.strictObject({ base: stampSchema.nullable(), over: stampSchema.optional() });
const lostSchema = z.strictObject({
  field: fieldName,
  value: z.json(),
  stamp: stampSchema,
  base: stampSchema.nullable(),
});

const frameSchema = z.object({
  clubId: idSchema,
  type: z.enum(WRITABLE_TYPES),
  id: idSchema,
  seq: z.int().min(0),
  at: stampSchema,
  stamps: z.record(fieldName, stampSchema).optional(),
  debt: z.object({
    since: z.int(),
    fields: z.record(fieldName, owedSchema),
    lost: z.array(lostSchema).max(1000).optional(),
  }),
});

/** The record where it is whole, its debt set to be sent anew; null where anything of it is not as it must be. */
export function wholeRecord(value: unknown): StoredRecord | null {
  const frame = frameSchema.safeParse(value);
  if (!frame.success) return null;
  const fields = RECORD_SCHEMAS[frame.data.type].safeParse((value as { fields?: unknown }).fields);
  if (!fields.success) return null;
  const { debt, stamps, ...rest } = frame.data;
  const ownerId = (value as { ownerId?: unknown }).ownerId;
  const record = {
    ...rest,
    ownerId: typeof ownerId === 'string' ? ownerId : null,
    fields: fields.data,
    ...(stamps ? { stamps } : {}),
    debt: { ...debt, status: 'waiting' as const },
  };
  return record as StoredRecord;
}
