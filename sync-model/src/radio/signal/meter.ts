import type { MeterReading } from '../../records/common-fields.js';
import type { MeterScale } from '../../records/receiver.js';
import { figureText } from '../figure-text.js';

/** IARU Region 1 Technical Recommendation R.1: S9 is −73 dBm up to 30 MHz and −93 dBm above. */
export const R1_S9_DBM = -73;
const R1_STEP_ABOVE_HF_DB = 20;
const HF_TOP_HZ = 30_000_000;

/** Noise and signal levels are powers into 50 Ω. */
const IMPEDANCE_OHM = 50;

/**
 * The level that this scale calls S9 at a frequency, in dBm. A scale whose S9 is the −73 dBm of R.1 is taken
 * to follow R.1 as a whole, so it is 20 dB lower above 30 MHz. Any other S9 was measured or habit (−67 dBm
 * was one), says nothing of such a step, and is taken as it stands at every frequency.
 */
export function s9DbmAt(scale: MeterScale, frequencyHz: number): number {
  const followsR1 = scale.s9Dbm === R1_S9_DBM;
  return followsR1 && frequencyHz > HF_TOP_HZ ? scale.s9Dbm - R1_STEP_ABOVE_HF_DB : scale.s9Dbm;
}

/**
 * The level at the receiver's input in dBm by its own scale: dBm as read, S-units as
 * S9 + (S − 9) × dB per S-unit + the dB above. Null where the receiver has no meter.
 * Attenuator and preamplifier are not taken off here.
 */
export function levelDbm(reading: MeterReading, scale: MeterScale, frequencyHz: number): number | null {
  if (scale.kind === 'none') return null;
  if ('dbm' in reading) return reading.dbm;
  return s9DbmAt(scale, frequencyHz) + (reading.s - 9) * scale.dbPerS + reading.overDb;
}

/**
 * A level as this scale's meter would show it: S-units up to 9 with fractions, and above that the dB over S9.
 * Nothing is below S0. Null where the receiver has no meter.
 */
export function sUnitsOf(
  dbm: number,
  scale: MeterScale,
  frequencyHz: number,
): { s: number; overDb: number } | null {
  if (scale.kind === 'none') return null;
  const aboveS9Db = dbm - s9DbmAt(scale, frequencyHz);
  if (aboveS9Db >= 0) return { s: 9, overDb: aboveS9Db };
  return { s: Math.max(0, 9 + aboveS9Db / scale.dbPerS), overDb: 0 };
}

/** The voltage across 50 Ω (potential difference, not EMF) of a power in dBm, in µV: V = √(R·P). */
export function dbmToMicrovolts(dbm: number): number {
  return Math.sqrt(IMPEDANCE_OHM * 10 ** (dbm / 10) * 1e-3) * 1e6;
}

/** The same voltage in dB above 1 µV: dBm + 10 log 50 + 90. */
export function dbmToDbMicrovolts(dbm: number): number {
  return dbm + 10 * Math.log10(IMPEDANCE_OHM) + 90;
}

/** A reading as it was read: "S7", "S9+20", "−85 dBm". */
export function formatMeter(reading: MeterReading): string {
  if ('dbm' in reading) return figureText(reading.dbm, 1, 'dBm');
  const over = figureText(reading.overDb, 1);
  return over === '0' ? `S${reading.s}` : `S${reading.s}+${over}`;
}
