import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import type { Antenna } from '@harkmoor/sync-model/records/antenna';
import type { Receiver } from '@harkmoor/sync-model/records/receiver';
import type { Setup } from '@harkmoor/sync-model/records/setup';
import type { SetupRow } from './data/gear';

export const ANTENNA_KIND_WORDS: Record<Antenna['kind'], string> = {
  whip: 'Whip',
  wire: 'Wire',
  dipole: 'Dipole',
  vertical: 'Vertical',
  ferrite: 'Ferrite',
  loop: 'Loop',
  active: 'Active',
  beam: 'Beam',
  other: 'Other',
};

export const METER_KIND_WORDS: Record<Receiver['meterScale']['kind'], string> = {
  s: 'S-meter',
  dbm: 'dBm',
  none: 'No meter',
};

/** 'Wire, 22 m long, 4 m high'. */
export function antennaNote(antenna: Antenna): string {
  const parts = [ANTENNA_KIND_WORDS[antenna.kind]];
  if (antenna.lengthM !== null) parts.push(`${antenna.lengthM}\u202fm long`);
  if (antenna.heightM !== null) parts.push(`${antenna.heightM}\u202fm high`);
  if (antenna.azimuthDeg !== null) parts.push(`towards ${antenna.azimuthDeg}°`);
  return parts.join(', ');
}

/** '150 kHz to 30 MHz · S-meter'. */
export function receiverNote(receiver: Receiver): string {
  const ranges = receiver.ranges.map(
    ({ lowHz, highHz }) => `${frequencyText(lowHz)} to ${frequencyText(highHz)}`,
  );
  const meter = METER_KIND_WORDS[receiver.meterScale.kind];
  return [...ranges, receiver.meterScale.calibrated ? `${meter}, calibrated` : meter].join(' · ');
}

/** 'Long wire on Grey portable'. */
export function setupName({ receiver, antenna }: SetupRow): string {
  return `${antenna?.fields.name ?? 'Unknown antenna'} on ${receiver?.fields.name ?? 'unknown receiver'}`;
}

export function setupNote(setup: Setup): string {
  const parts = [setup.coupling ?? ''];
  if (setup.attenuationDb > 0) parts.push(`${setup.attenuationDb}\u202fdB attenuation`);
  if (setup.preampDb > 0) parts.push(`${setup.preampDb}\u202fdB preamplifier`);
  return parts.filter((part) => part !== '').join(', ');
}

/** Wavelength c/f; a half-wave dipole is cut to 142.65/f MHz m (ARRL Handbook's 468 ft; domain value, from secondary pages). */
export function antennaFigures(antenna: Antenna): string[] {
  if (antenna.lengthM === null) return [];
  const figures = [`Quarter wave near ${frequencyText(roundHz((71.5 / antenna.lengthM) * 1e6))}`];
  if (antenna.kind === 'dipole')
    figures.unshift(`Half wave near ${frequencyText(roundHz((142.65 / antenna.lengthM) * 1e6))}`);
  return figures;
}

function roundHz(hz: number): number {
  return Math.round(hz / 10_000) * 10_000;
}
