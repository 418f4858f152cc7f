import { z } from 'zod';
import { idSchema } from '../records/common-fields.js';
import { ROLES } from '../records/member.js';
import { SERVER_TYPES, WRITABLE_TYPES } from '../records/record-types.js';
import { DEVICE_ID_PATTERN, STAMP_PATTERN } from '../stamp/stamp.js';
import { CHANGES_PER_ROUND_MAX, CLUBS_PER_ROUND_MAX, RECORDS_PER_PAGE_MAX } from './limits.js';

/**
 * The messages of the sync round for the server's border and its API description. Field values pass as they
 * are: the hub checks them one by one, so that a single bad record never refuses a round.
 */
const FIELD_NAME_LENGTH_MAX = 40;
const FIELDS_MAX = 60;

export const stampSchema = z.string().regex(STAMP_PATTERN, 'must be a stamp of 24 characters');
const fieldNameSchema = z.string().min(1).max(FIELD_NAME_LENGTH_MAX);
const hasFewKeys = (record: object) => Object.keys(record).length <= FIELDS_MAX;
const fieldsSchema = z.record(fieldNameSchema, z.unknown()).refine(hasFewKeys, 'has too many fields');
const stampsSchema = z.record(fieldNameSchema, stampSchema).refine(hasFewKeys, 'has too many stamps');
const seqSchema = z.int().min(0);
const historyIdSchema = z.string().min(1).max(64);
const writableTypeSchema = z.enum(WRITABLE_TYPES);

export const changeSchema = z.strictObject({
  type: writableTypeSchema,
  id: idSchema,
  at: stampSchema,
  fields: fieldsSchema,
  stamps: stampsSchema.optional(),
  base: stampsSchema.optional(),
});

export const syncClubRequestSchema = z.strictObject({
  clubId: idSchema,
  historyId: historyIdSchema.nullable(),
  cursor: seqSchema,
  changes: z.array(changeSchema).max(CHANGES_PER_ROUND_MAX).optional(),
});

/** A round as it enters the server: at most 1 000 changes over all its clubs, each club once. */
export const syncRequestSchema = z.strictObject({
  protocol: z.int().min(1).max(1_000_000),
  deviceId: z.string().regex(DEVICE_ID_PATTERN, 'must be 8 lower-case letters or digits'),
  sentAt: z.int(),
  clubs: z
    .array(syncClubRequestSchema)
    .max(CLUBS_PER_ROUND_MAX)
    .refine((clubs) => new Set(clubs.map(({ clubId }) => clubId)).size === clubs.length, 'names a club twice')
    .refine(
      (clubs) => clubs.reduce((sum, club) => sum + (club.changes?.length ?? 0), 0) <= CHANGES_PER_ROUND_MAX,
      `holds more than ${CHANGES_PER_ROUND_MAX} changes`,
    ),
});

export const refusalCodeSchema = z.enum([
  'invalid',
  'forbidden',
  'not-found',
  'too-large',
  'whole-record-needed',
]);

export const changeResultSchema = z.discriminatedUnion('status', [
  z.strictObject({ type: writableTypeSchema, id: idSchema, status: z.literal('applied'), seq: seqSchema }),
  z.strictObject({ type: writableTypeSchema, id: idSchema, status: z.literal('held'), needs: idSchema }),
  z.strictObject({
    type: writableTypeSchema,
    id: idSchema,
    status: z.literal('refused'),
    code: refusalCodeSchema,
    message: z.string(),
  }),
]);

export const feedRecordSchema = z.strictObject({
  type: z.enum([...WRITABLE_TYPES, ...SERVER_TYPES]),
  id: z.string().min(1).max(64),
  ownerId: z.string().nullable(),
  seq: seqSchema,
  at: stampSchema,
  fields: fieldsSchema,
  stamps: stampsSchema.optional(),
});

export const clubCardSchema = z.strictObject({
  name: z.string(),
  kind: z.enum(['club', 'my-log']),
  ituRegion: z.union([z.literal(1), z.literal(2), z.literal(3)]),
  demo: z.boolean(),
});

export const syncClubAnswerSchema = z.strictObject({
  clubId: idSchema,
  role: z.enum(ROLES),
  card: clubCardSchema,
  historyId: historyIdSchema,
  headSeq: seqSchema,
  results: z.array(changeResultSchema).max(CHANGES_PER_ROUND_MAX),
  records: z.array(feedRecordSchema).max(RECORDS_PER_PAGE_MAX),
  cursor: seqSchema,
  more: z.boolean(),
});

export const syncAnswerSchema = z.strictObject({
  protocol: z.int().min(1),
  serverTime: z.int(),
  code: z.enum(['clock-ahead', 'protocol-too-old']).optional(),
  clubs: z.array(syncClubAnswerSchema),
  goneClubs: z.array(idSchema),
});
