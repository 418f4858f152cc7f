import type { z } from 'zod';
import { antennaSchema, type Antenna } from './antenna.js';
import { attachmentSchema, type Attachment } from './attachment.js';
import { clockCheckSchema, type ClockCheck } from './clock-check.js';
import { dialCheckSchema, type DialCheck } from './dial-check.js';
import type { History } from './history.js';
import type { Member } from './member.js';
import { noiseReadingSchema, type NoiseReading } from './noise-reading.js';
import { outingSchema, type Outing } from './outing.js';
import { receiverSchema, type Receiver } from './receiver.js';
import { receptionSchema, type Reception } from './reception.js';
import type { WritableType } from './record-types.js';
import { setupSchema, type Setup } from './setup.js';
import { siteFixSchema, type SiteFix } from './site-fix.js';
import { siteSchema, type Site } from './site.js';
import { swapTestSchema, type SwapTest } from './swap-test.js';
import { targetListSchema, type TargetList } from './target-list.js';
import { targetSchema, type Target } from './target.js';

/** The fields of each record type, as TypeScript sees them. Optional fields are null where empty, never absent. */
export type FieldsByType = {
  site: Site;
  'site-fix': SiteFix;
  receiver: Receiver;
  antenna: Antenna;
  setup: Setup;
  'target-list': TargetList;
  target: Target;
  outing: Outing;
  'swap-test': SwapTest;
  reception: Reception;
  'clock-check': ClockCheck;
  'dial-check': DialCheck;
  'noise-reading': NoiseReading;
  attachment: Attachment;
  member: Member;
  history: History;
};

/** The zod schema of each type that a phone may write. Keep this file out of the phone's first chunk. */
export const RECORD_SCHEMAS = {
  site: siteSchema,
  'site-fix': siteFixSchema,
  receiver: receiverSchema,
  antenna: antennaSchema,
  setup: setupSchema,
  'target-list': targetListSchema,
  target: targetSchema,
  outing: outingSchema,
  'swap-test': swapTestSchema,
  reception: receptionSchema,
  'clock-check': clockCheckSchema,
  'dial-check': dialCheckSchema,
  'noise-reading': noiseReadingSchema,
  attachment: attachmentSchema,
} satisfies Record<WritableType, z.ZodObject>;
