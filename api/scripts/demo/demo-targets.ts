import type { Mode } from '@harkmoor/sync-model/records/common-fields';
import type { Schedule } from '@harkmoor/sync-model/records/target';

/** Invented stations on plausible frequencies. `opensAt`: the sun altitude (°) around which the band turns. */
export type DemoTarget = {
  readonly name: string;
  readonly frequencyHz: number;
  readonly mode: Mode;
  readonly schedule: Schedule;
  readonly tx: { readonly latDeg: number; readonly lonDeg: number };
  readonly powerKw: number;
  readonly language: string | null;
  readonly bestLogit: number;
  readonly worstLogit: number;
  readonly heardBy: 'night' | 'day' | 'always';
};

const EVERY_DAY = [1, 2, 3, 4, 5, 6, 7];
const slot = (from: string, to: string, days = EVERY_DAY) => ({ from, to, days });

export const DEMO_TARGETS: readonly DemoTarget[] = [
  target('Radio Halvøya', 1_386_000, 'night', [2.2, -2.4], { latDeg: 59.2, lonDeg: 5.4 }, 50, [
    slot('15:00', '06:00'),
  ]),
  target(
    'Hvidnæs coast weather',
    2_586_000,
    'night',
    [2.6, -0.8],
    { latDeg: 57.1, lonDeg: 8.6 },
    1,
    'always',
    'USB',
  ),
  target('Radio Marquenne', 3_955_000, 'night', [2.4, -3.2], { latDeg: 50.9, lonDeg: 3.1 }, 100, [
    slot('16:00', '07:00'),
  ]),
  target(
    'Tone service, Skovtop',
    5_000_000,
    'night',
    [2.0, -0.6],
    { latDeg: 47.3, lonDeg: 1.4 },
    10,
    'always',
  ),
  target('Radio Lindholt', 6_070_000, 'night', [1.2, -1.6], { latDeg: 53.4, lonDeg: 20.6 }, 100, [
    slot('04:00', '20:00'),
  ]),
  target('Voice of Estavera', 7_255_000, 'night', [1.0, -2.2], { latDeg: 27.4, lonDeg: 17.2 }, 250, [
    slot('17:00', '23:00'),
    slot('03:00', '07:00'),
  ]),
  target('Norrskär Radio', 9_640_000, 'always', [0.8, 0.1], { latDeg: 61.8, lonDeg: 21.3 }, 100, [
    slot('05:00', '21:00'),
  ]),
  target('Tessel Overseas', 11_730_000, 'day', [1.6, -2.4], { latDeg: 25.2, lonDeg: 51.1 }, 250, [
    slot('06:00', '18:00'),
    slot('19:00', '22:00'),
  ]),
  target(
    'Tone service, Kaplevo',
    10_000_000,
    'always',
    [1.4, 0.5],
    { latDeg: 55.6, lonDeg: 37.2 },
    8,
    'always',
  ),
  target('Kestrel Relay', 15_150_000, 'day', [1.8, -3.0], { latDeg: 7.9, lonDeg: -14.2 }, 250, [
    slot('06:00', '20:00'),
  ]),
  target('Orlanda International', 17_605_000, 'day', [1.2, -3.6], { latDeg: 1.2, lonDeg: 103.9 }, 100, [
    slot('07:00', '17:00'),
  ]),
  target('Tornby local', 98_400_000, 'always', [3.2, 3.0], { latDeg: 56.17, lonDeg: 8.3 }, 1, 'always', 'FM'),
];

function target(
  name: string,
  frequencyHz: number,
  heardBy: DemoTarget['heardBy'],
  [bestLogit, worstLogit]: readonly [number, number],
  tx: DemoTarget['tx'],
  powerKw: number,
  schedule: Schedule,
  mode: Mode = 'AM',
): DemoTarget {
  const language = name.startsWith('Tone') ? null : 'invented';
  return { name, frequencyHz, mode, schedule, tx, powerKw, language, bestLogit, worstLogit, heardBy };
}

/** The station that fell silent for a week. */
export const DEMO_SILENCE = {
  targetName: 'Radio Lindholt',
  from: Date.UTC(2026, 9, 12),
  to: Date.UTC(2026, 9, 19),
} as const;
