import type { Observation } from '../observations.js';

/** Heard at the dune on 6 070 kHz with the long wire, at 19 UTC of day 20 769 (12 November 2026). */
export function anObservation(more: Partial<Observation> = {}): Observation {
  const dayNumber = more.dayNumber ?? 20_769;
  const hourUtc = more.hourUtc ?? 19;
  const channelKey = more.channelKey ?? '6070000';
  return {
    receptionId: `r-${channelKey}-${dayNumber}-${hourUtc}`,
    ownerId: 'asta',
    siteId: 'dune',
    setupId: 'bench-wire',
    antennaId: 'wire',
    receiverId: 'bench',
    targetId: null,
    channelKey,
    bandKey: '49 m broadcast',
    isWholeBand: false,
    frequencyHz: Number(channelKey) || 7_050_000,
    atMs: (dayNumber * 24 + hourUtc) * 3_600_000,
    timeBasis: 'between',
    hourUtc,
    dayNumber,
    monthKey: '2026-11',
    heard: true,
    o: 4,
    levelDbm: null,
    isInReview: false,
    counts: 'try',
    reason: null,
    ...more,
  };
}

/** One observation a date: `heard` of `n` heard. */
export function evenings(n: number, heard: number, more: Partial<Observation> = {}): Observation[] {
  return Array.from({ length: n }, (_, i) =>
    anObservation({ dayNumber: 20_769 + i, heard: i < heard, ...more }),
  );
}
