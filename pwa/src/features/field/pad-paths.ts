import type { Mode } from '@harkmoor/sync-model/records/common-fields';
import { paths } from '../../platform/paths';
import type { StoredReception } from './data/outing-entries';
import type { StoredTarget } from './data/outing-frame';

/** The address of the pad after *Heard* on a row. `draft` is the id that the reception will have. */
export function padForRow(target: StoredTarget, roundNo: number, atMs: number, draft: string): string {
  return paths.pad({ targetId: target.id, means: 'round', roundNo, atMs, draft });
}

export function padForFrequency(
  entered: { dialHz: number; mode: Mode; means: 'planned' | 'chance'; targetId: string | null },
  atMs: number,
  draft: string,
): string {
  const { dialHz, mode, means, targetId } = entered;
  return paths.pad({ frequencyHz: dialHz, mode, means, targetId: targetId ?? undefined, atMs, draft });
}

/**
 * *Same again*: the old signal once more. A row that still waits in this round gets its answer; else it is a
 * planned try, or again a chance find.
 */
export function padForSameAgain(
  before: StoredReception,
  waits: { inRound: number | null },
  atMs: number,
  draft: string,
): string {
  const { tuning, targetId, basis } = before.fields;
  const shared = { again: before.id, atMs, draft, targetId: targetId ?? undefined };
  if (waits.inRound !== null && targetId !== null) {
    return paths.pad({ ...shared, means: 'round', roundNo: waits.inRound });
  }
  const means = basis === 'chance' ? 'chance' : 'planned';
  return paths.pad({ ...shared, frequencyHz: tuning.dialHz, mode: tuning.mode, means });
}

export function padForEdit(receptionId: string): string {
  return paths.pad({ receptionId });
}
