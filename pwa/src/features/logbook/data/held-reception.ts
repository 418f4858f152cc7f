import type { EvidenceOuting } from '@harkmoor/sync-model/evidence/evidence-input';
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import type { FieldsByType } from '@harkmoor/sync-model/records/schemas';
import type { RecordType } from '@harkmoor/sync-model/records/record-types';
import type { ItuRegion } from '@harkmoor/sync-model/radio/bands/region';
import type { ClockCheck } from '@harkmoor/sync-model/records/clock-check';
import type { DialCheck } from '@harkmoor/sync-model/records/dial-check';

/** One reception with all that this device holds about it. What is not here is null, never guessed. */
export type HeldReception = {
  readonly record: StoredRecord<'reception'>;
  readonly region: ItuRegion;
  readonly clubId: string;
  /** The account that looks at it; null for a guest. */
  readonly ownId: string | null;
  readonly isOwn: boolean;
  readonly site: FieldsByType['site'] | null;
  /** Only of one's own sites: it lies in My log. */
  readonly siteFix: FieldsByType['site-fix'] | null;
  readonly outing: FieldsByType['outing'] | null;
  readonly setup: FieldsByType['setup'] | null;
  readonly receiver: FieldsByType['receiver'] | null;
  readonly antenna: FieldsByType['antenna'] | null;
  readonly target: FieldsByType['target'] | null;
  readonly clockChecks: readonly ClockCheck[];
  readonly outingsAround: readonly EvidenceOuting[];
  readonly dialChecks: readonly DialCheck[];
  /** Rows of the history that travel to every device: where two values met. */
  readonly clashes: readonly StoredRecord<'history'>[];
  /** What ids in replaced values and owners are called. */
  readonly names: NamesOfIds;
};

/** The names that this device knows, by type and id. */
export type NamesOfIds = (
  type: Extract<RecordType, 'member' | 'site' | 'setup' | 'target'>,
  id: string,
) => string | null;
