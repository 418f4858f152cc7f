import type { Reception } from './reception.js';
import type { Target } from './target.js';

export type RoundEntry = {
  id: string;
  fields: Pick<Reception, 'targetId' | 'roundNo' | 'outcome' | 'deleted'>;
};
type RoundTarget = { id: string; fields: Pick<Target, 'frequencyHz' | 'name'> };

export type RoundRow<T, E> = {
  target: T;
  /** The latest entry of this target in this round; null while it waits for its answer. */
  entry: E | null;
  isOnAir: boolean;
  /** The first row that is on the air and has no answer yet. */
  isNext: boolean;
};

export type Round<T, E> = {
  rows: RoundRow<T, E>[];
  answered: number;
  total: number;
  /** True once every row that is on the air has its answer. */
  isDone: boolean;
};

/** The order of a round: by frequency, so that the dial goes one way; then by name and id, so that it never changes by chance. */
export function inRoundOrder<T extends RoundTarget>(targets: readonly T[]): T[] {
  return [...targets].sort(
    (a, b) =>
      a.fields.frequencyHz - b.fields.frequencyHz ||
      compareText(a.fields.name, b.fields.name) ||
      compareText(a.id, b.id),
  );
}

/** One round of an outing as it stands: its rows in order, their answers, what comes next. */
export function roundOf<T extends RoundTarget, E extends RoundEntry>(given: {
  targets: readonly T[];
  entries: readonly E[];
  roundNo: number;
  isOnAir: (target: T) => boolean;
}): Round<T, E> {
  const answers = answersOf(given.entries, given.roundNo);
  let hasNext = false;
  let isDone = given.targets.length > 0;
  const rows = given.targets.map((target) => {
    const entry = answers.get(target.id) ?? null;
    const isOnAir = given.isOnAir(target);
    const isWaiting = entry === null && isOnAir;
    if (isWaiting) isDone = false;
    const isNext = isWaiting && !hasNext;
    hasNext ||= isNext;
    return { target, entry, isOnAir, isNext };
  });
  return { rows, answered: rows.filter((row) => row.entry).length, total: rows.length, isDone };
}

function answersOf<E extends RoundEntry>(entries: readonly E[], roundNo: number): Map<string, E> {
  const answers = new Map<string, E>();
  for (const entry of entries) {
    const { targetId, deleted } = entry.fields;
    if (deleted || targetId === null || entry.fields.roundNo !== roundNo) continue;
    const known = answers.get(targetId);
    // ids are made in order of time (UUIDv7): the later entry speaks for the row
    if (!known || known.id < entry.id) answers.set(targetId, entry);
  }
  return answers;
}

/**
 * The round that an outing is in. `startedRoundNo` is the round that this phone began by hand, if any: a round
 * without an entry is known to nobody else.
 */
export function currentRoundNo(entries: readonly RoundEntry[], startedRoundNo = 1): number {
  return entries.reduce(
    (highest, { fields }) => (fields.deleted ? highest : Math.max(highest, fields.roundNo ?? 1)),
    Math.max(1, startedRoundNo),
  );
}

export const ROUND_NO_MAX = 999;

function compareText(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}
