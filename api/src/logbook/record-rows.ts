import type { EntityClass } from '@mikro-orm/core';
import type { WritableType } from '@harkmoor/sync-model/records/record-types';
import { AntennaRow } from './rows/antenna.row.js';
import { AttachmentRow } from './rows/attachment.row.js';
import { ClockCheckRow } from './rows/clock-check.row.js';
import { DialCheckRow } from './rows/dial-check.row.js';
import { NoiseReadingRow } from './rows/noise-reading.row.js';
import { OutingRow } from './rows/outing.row.js';
import { ReceiverRow } from './rows/receiver.row.js';
import { ReceptionRow } from './rows/reception.row.js';
import type { RecordRow } from './rows/record.row.js';
import { SetupRow } from './rows/setup.row.js';
import { SiteFixRow } from './rows/site-fix.row.js';
import { SiteRow } from './rows/site.row.js';
import { SwapTestRow } from './rows/swap-test.row.js';
import { TargetListRow } from './rows/target-list.row.js';
import { TargetRow } from './rows/target.row.js';

/** The entity, and so the table, of each record type that a phone may write. */
export const RECORD_ROWS: Readonly<Record<WritableType, EntityClass<RecordRow>>> = {
  site: SiteRow,
  'site-fix': SiteFixRow,
  receiver: ReceiverRow,
  antenna: AntennaRow,
  setup: SetupRow,
  'target-list': TargetListRow,
  target: TargetRow,
  outing: OutingRow,
  'swap-test': SwapTestRow,
  reception: ReceptionRow,
  'clock-check': ClockCheckRow,
  'dial-check': DialCheckRow,
  'noise-reading': NoiseReadingRow,
  attachment: AttachmentRow,
};

export const LOGBOOK_ENTITIES = Object.values(RECORD_ROWS);
