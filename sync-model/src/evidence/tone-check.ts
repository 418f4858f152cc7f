/** Speed of light in vacuum, km per ms: how late the tone of a distant transmitter arrives. */
const LIGHT_KM_PER_MS = 299.792458;
/**
 * How far a thumb falls from an awaited pip, ms: a tap in time with a rhythm is off by some tens of ms, a first
 * one by up to about 300 ms (common practice, no source). The taps' own spread replaces it once it is larger.
 */
const ONE_TAP_UNCERTAINTY_MS = 300;
const MANY_TAPS_UNCERTAINTY_MS = 100;
const MINUTE_MS = 60_000;

export type ToneCheck = { deviceAt: number; offsetMs: number; uncertaintyMs: number };

/**
 * A device clock against the minute tone of a time signal. `tapsMs` are the device's times of taps at minute
 * pips; `minuteShift` corrects the minute where the device is off by half a minute or more; `pathKm` takes off
 * the way from the transmitter. The offset (true − device, ms) is the median of the taps. Throws without a tap.
 */
export function toneCheck(
  tapsMs: readonly number[],
  minuteShift = 0,
  pathKm: number | null = null,
): ToneCheck {
  const last = tapsMs.at(-1);
  if (last === undefined) throw new Error('a check by tone needs a tap');
  const travelMs = (pathKm ?? 0) / LIGHT_KM_PER_MS;
  const offsets = tapsMs.map((tap) => nearestMinute(tap) + minuteShift * MINUTE_MS + travelMs - tap);
  const spread = Math.max(...offsets) - Math.min(...offsets);
  const floor = tapsMs.length >= 3 ? MANY_TAPS_UNCERTAINTY_MS : ONE_TAP_UNCERTAINTY_MS;
  return {
    deviceAt: last,
    offsetMs: Math.round(median(offsets)),
    uncertaintyMs: Math.round(Math.max(floor, spread / 2)),
  };
}

/** The minute mark that a tap most likely heard, ms. */
export function nearestMinute(tapMs: number): number {
  return Math.round(tapMs / MINUTE_MS) * MINUTE_MS;
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[middle]! : (sorted[middle - 1]! + sorted[middle]!) / 2;
}
