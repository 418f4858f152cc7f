import type { Debt, StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { formatFrequency } from '@harkmoor/sync-model/radio/bands/frequency-text';
import type { RecordType } from '@harkmoor/sync-model/records/record-types';
import { utcDateTime } from '../../platform/utc-text';

const TYPE_WORDS: Record<RecordType, string> = {
  site: 'Site',
  'site-fix': 'Exact position',
  receiver: 'Receiver',
  antenna: 'Antenna',
  setup: 'Setup',
  'target-list': 'Target list',
  target: 'Target',
  outing: 'Outing',
  'swap-test': 'Swap test',
  reception: 'Reception',
  'clock-check': 'Clock check',
  'dial-check': 'Dial check',
  'noise-reading': 'Noise reading',
  attachment: 'Attachment',
  member: 'Member',
  event: 'Event',
  'event-result': 'Event result',
  review: 'Review',
  history: 'History',
};

/** What waits, so that a person knows which one it is. */
export function waitingName(record: StoredRecord): string {
  const word = TYPE_WORDS[record.type];
  const fields = record.fields as Record<string, unknown>;
  if (record.type === 'reception') {
    const { dialHz } = fields.tuning as { dialHz: number };
    const { figure, unit } = formatFrequency(dialHz);
    return `${word} ${figure}\u202f${unit}, ${utcDateTime(fields.deviceAt as number)}`;
  }
  if (typeof fields.name === 'string') return `${word} “${fields.name}”`;
  if (typeof fields.startedAt === 'number') return `${word} of ${utcDateTime(fields.startedAt)}`;
  return word;
}

/** Why it waits and what happens next. */
export function waitingReason(debt: Debt): string {
  switch (debt.status) {
    case 'waiting':
      return 'Goes with the next round';
    case 'held':
      return 'Goes after the record it belongs to';
    case 'refused':
      return `${debt.message ?? 'The server did not take it.'} Edit it, and it is sent again.`;
  }
}
