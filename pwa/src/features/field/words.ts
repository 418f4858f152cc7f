import type { ClockTrust } from '@harkmoor/sync-model/evidence/clock-trust';
import type { OnAirState } from '@harkmoor/sync-model/evidence/schedule';
import { formatFrequency } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { bandAt, bandLabel } from '@harkmoor/sync-model/radio/bands/bands';
import type { ItuRegion } from '@harkmoor/sync-model/radio/bands/region';
import type { Path } from '@harkmoor/sync-model/radio/path/path';
import { formatSinpo } from '@harkmoor/sync-model/radio/signal/sinpo';
import { formatRst } from '@harkmoor/sync-model/radio/signal/rst';
import type { NilReason } from '@harkmoor/sync-model/records/reception-from-tap';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import type { Place } from '@harkmoor/sync-model/records/site';
import { agoWords, figureText, isoDate, shortDate, utcHourMinute, withUnit } from '../../platform/utc-text';

/** For screen readers: "6070 kilohertz". */
export function spokenFrequency(frequencyHz: number): string {
  const { figure, unit } = formatFrequency(frequencyHz);
  return `${figure.replace(/\s/g, '')} ${unit === 'kHz' ? 'kilohertz' : 'megahertz'}`;
}

/** "49 m broadcast", or empty outside the bands. */
export function bandWords(frequencyHz: number, region: ItuRegion): string {
  const band = bandAt(frequencyHz, region);
  return band ? bandLabel(band) : '';
}

/** "862 km · 98°". */
export function pathWords({ distanceKm, bearingDeg }: Path): string {
  return `${withUnit(Math.round(distanceKm), 'km')} · ${Math.round(bearingDeg) % 360}°`;
}

/** "on air to 20:00"; empty where it does not end. */
export function onAirWords(state: OnAirState): string {
  return state.kind === 'on' && state.until !== null ? `on air to ${utcHourMinute(state.until)}` : '';
}

/** "Off air until 19:00", with the date where that is another UTC day. */
export function offAirWords(state: OnAirState, nowMs: number): string {
  if (state.kind === 'on' || state.from === null) return 'Off air';
  const isToday = isoDate(state.from) === isoDate(nowMs);
  return `Off air until ${isToday ? '' : `${shortDate(state.from)}, `}${utcHourMinute(state.from)}`;
}

export const NIL_REASON_WORDS: Readonly<Record<NilReason, string>> = {
  nothing: 'Nothing on the frequency',
  covered: 'Covered by another station',
  noise: 'Too much noise here',
  fault: 'Receiver or antenna fault',
};

/** "35433", "59", "Nil", "Nil, noise", "Skipped"; carried figures are no score of this entry. */
export function outcomeWords(
  fields: Pick<Reception, 'outcome' | 'nilReason' | 'sinpo' | 'rst' | 'carried'>,
): string {
  if (fields.outcome === 'nil') return fields.nilReason ? `Nil, ${fields.nilReason}` : 'Nil';
  if (fields.outcome === 'skipped') return 'Skipped';
  if (fields.sinpo && !fields.carried?.includes('sinpo')) return formatSinpo(fields.sinpo);
  if (fields.rst && !fields.carried?.includes('rst')) return formatRst(fields.rst);
  return 'Heard';
}

/** The small line under the clock, and whether it is a warning. */
export function clockWords(trust: ClockTrust, nowMs: number): { text: string; isWarning: boolean } {
  switch (trust.kind) {
    case 'checked':
      return {
        text: `checked ${agoWords(trust.check.deviceAt, nowMs)}, ${offsetWords(trust.check.offsetMs)}`,
        isWarning: false,
      };
    case 'old':
      return { text: `last checked ${agoWords(trust.check.deviceAt, nowMs)}`, isWarning: true };
    case 'stepped':
      return { text: `clock was set ${agoWords(trust.stepAt, nowMs)}`, isWarning: true };
    case 'unchecked':
      return { text: 'clock not checked', isWarning: true };
  }
}

/** How a device stands against true time: "5.1 s fast", "0.7 s slow". `offsetMs`: true − device. */
export function aheadWords(offsetMs: number): string {
  if (offsetMs === 0) return 'right';
  return `${offsetWords(-Math.abs(offsetMs)).slice(1)} ${offsetMs < 0 ? 'fast' : 'slow'}`;
}

/** What is added to the device's time: "+0.3 s", "−3 min". */
export function offsetWords(offsetMs: number): string {
  const sign = offsetMs < 0 ? '' : '+';
  if (Math.abs(offsetMs) < 60_000) return `${sign}${withUnit(offsetMs / 1000, 's', 1)}`;
  if (Math.abs(offsetMs) < 3_600_000) return `${sign}${withUnit(offsetMs / 60_000, 'min', 1)}`;
  return `${sign}${withUnit(offsetMs / 3_600_000, 'h', 1)}`;
}

/** What others are shown of a place: its square, or the exact point where the owner said so. */
export function othersSee(place: Place): string {
  if ('locator' in place) return place.locator;
  return `the exact point ${figureText(place.latDeg, 4)}°, ${figureText(place.lonDeg, 4)}°`;
}
