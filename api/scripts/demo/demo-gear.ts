import type { Antenna } from '@harkmoor/sync-model/records/antenna';
import type { Receiver } from '@harkmoor/sync-model/records/receiver';

/** Five receivers and eight antennas, none of any maker. */
export type DemoReceiver = Pick<Receiver, 'name' | 'meterScale' | 'ranges' | 'ifHz' | 'supplyMa'> & {
  readonly hasMeter: boolean;
};

/** `clearer` moves the chance of hearing (logit) on the bands between the two frequencies; `louderDb` moves the meter alone. */
export type DemoAntenna = Pick<Antenna, 'name' | 'kind' | 'lengthM' | 'heightM'> & {
  readonly shiftLogit: number;
  readonly clearer?: { readonly lowHz: number; readonly highHz: number; readonly shiftLogit: number };
  readonly louderDb: number;
};

const SHORT_WAVE = [{ lowHz: 150_000, highHz: 30_000_000 }];
const WIDE = [{ lowHz: 150_000, highHz: 108_000_000 }];

export const DEMO_RECEIVERS: readonly DemoReceiver[] = [
  {
    name: 'Bench build no. 3',
    meterScale: scale('s', true),
    ranges: SHORT_WAVE,
    ifHz: [455_000],
    supplyMa: 38,
    hasMeter: true,
  },
  {
    name: 'Grey portable',
    meterScale: scale('s', false),
    ranges: WIDE,
    ifHz: [10_700_000, 455_000],
    supplyMa: 61,
    hasMeter: true,
  },
  {
    name: 'Blue software set',
    meterScale: scale('dbm', true),
    ranges: SHORT_WAVE,
    ifHz: null,
    supplyMa: 240,
    hasMeter: true,
  },
  {
    name: 'Ten-shilling regenerative',
    meterScale: scale('none', false),
    ranges: SHORT_WAVE,
    ifHz: null,
    supplyMa: 9,
    hasMeter: false,
  },
  {
    name: 'Kitchen shelf set',
    meterScale: scale('s', false),
    ranges: WIDE,
    ifHz: [455_000],
    supplyMa: 55,
    hasMeter: true,
  },
];

export const DEMO_ANTENNAS: readonly DemoAntenna[] = [
  antenna('Whip', 'whip', { lengthM: 1.2, heightM: 1, shiftLogit: -0.7, louderDb: -8 }),
  antenna('Long wire', 'wire', { lengthM: 22, heightM: 4, shiftLogit: 0.6, louderDb: 3 }),
  // really clearer on one band alone: less noise from the shore on 49 m
  antenna('Frame loop', 'loop', {
    lengthM: 4,
    heightM: 1.5,
    shiftLogit: 0,
    louderDb: -6,
    clearer: { lowHz: 5_900_000, highHz: 6_200_000, shiftLogit: 1.6 },
  }),
  antenna('Inverted dipole', 'dipole', { lengthM: 20, heightM: 7, shiftLogit: 0.5, louderDb: 4 }),
  // only louder: signal and noise rise alike
  antenna('Active rod', 'active', { lengthM: 1, heightM: 2, shiftLogit: 0, louderDb: 14 }),
  antenna('Short wire over a hedge', 'wire', { lengthM: 8, heightM: 2, shiftLogit: 0.1, louderDb: 0 }),
  antenna('Ferrite rod', 'ferrite', { lengthM: 0.2, heightM: 1, shiftLogit: -0.9, louderDb: -12 }),
  antenna('Fishing-rod vertical', 'vertical', { lengthM: 7, heightM: 7, shiftLogit: 0.3, louderDb: 2 }),
];

function scale(kind: 's' | 'dbm' | 'none', calibrated: boolean): Receiver['meterScale'] {
  return { kind, s9Dbm: -73, dbPerS: 6, calibrated };
}

function antenna(name: string, kind: Antenna['kind'], rest: Omit<DemoAntenna, 'name' | 'kind'>): DemoAntenna {
  return { name, kind, ...rest };
}
