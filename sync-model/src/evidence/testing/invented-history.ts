import type { ClockCheck } from '../../records/clock-check.js';
import { correctedAt } from '../corrected-time.js';
import type { EvidenceInput, EvidenceReception, ReceptionFields } from '../evidence-input.js';
import { anInput, aReception, DAY_MS, HOUR_MS, MINUTE_MS, scored, SETUPS } from './invented-evidence.js';

/** One reception of a random history, as a test draws it. */
export type Try = Pick<
  ReceptionFields,
  'outcome' | 'basis' | 'identity' | 'siteId' | 'deviceAt' | 'durationS' | 'deleted'
> & {
  readonly id: string;
  readonly target: 'tern' | 'plover' | 'dunlin' | null;
  readonly setupId: keyof typeof SETUPS;
  readonly deviceId: string;
  readonly ownerId: string;
  readonly o: 1 | 3 | 5 | 'X';
};

export type History = {
  readonly tries: readonly Try[];
  readonly clockChecks: readonly ClockCheck[];
  /** Positions in `tries` of those that a review excluded. */
  readonly excludedAt: readonly number[];
};

const HZ = { tern: 6_070_000, plover: 6_070_000, dunlin: 5_000_000 };

function receptionOf({ id, target, o, ...one }: Try): EvidenceReception {
  const dialHz = target === 'dunlin' || target === null ? 5_000_000 : 6_070_000;
  const { deviceId, ownerId, ...fields } = one;
  return aReception(
    id,
    {
      ...fields,
      targetId: target,
      targetHz: target && HZ[target],
      tuning: { dialHz, mode: 'AM' },
      sinpo: one.outcome === 'heard' ? scored(o) : null,
    },
    { deviceId, ownerId },
  );
}

/** The history as the counting takes it. */
export function inputOf({ tries, clockChecks, excludedAt }: History): EvidenceInput {
  const excluded = excludedAt.flatMap((at) => tries[at]?.id ?? []);
  return anInput(tries.map(receptionOf), { clockChecks, excludedIds: new Set(excluded) });
}

/** The recount: ids of the first tries, each with the text of its cell. */
export function recount(history: History, stream: 'channels' | 'targets'): Map<string, string> {
  const excluded = new Set(history.excludedAt.flatMap((at) => history.tries[at]?.id ?? []));
  const timed = history.tries.map((one) => ({
    ...one,
    atMs: correctedAt(one, history.clockChecks, []).atMs,
  }));
  timed.sort((a, b) => a.atMs - b.atMs || (a.id < b.id ? -1 : 1));
  const cells = new Map<string, string>();
  for (const one of timed) {
    if (one.deleted || excluded.has(one.id)) continue;
    if (one.basis !== 'round' && one.basis !== 'planned') continue;
    if (one.outcome === 'skipped') continue;
    if (one.outcome === 'nil' && one.durationS !== null && one.durationS < 10) continue;
    if (one.target === 'tern') {
      const date = new Date(one.atMs);
      if (date.toISOString().startsWith('2026-11-20')) continue;
      const msOfDay = one.atMs % DAY_MS;
      if (msOfDay < 18 * HOUR_MS - 2 * MINUTE_MS || msOfDay > 21 * HOUR_MS + 2 * MINUTE_MS) continue;
    }
    if (stream === 'targets') {
      if (one.target === null) continue;
      if (one.outcome === 'heard' && one.identity !== 'sure') continue;
    }
    const subject =
      stream === 'targets' ? one.target : one.target === null || one.target === 'dunlin' ? 5000 : 6070;
    const hour = new Date(one.atMs).toISOString().slice(0, 13);
    const cell = [subject, one.siteId, SETUPS[one.setupId].antennaId, hour].join(' ');
    if (!cells.has(cell)) cells.set(cell, one.id);
  }
  return cells;
}
