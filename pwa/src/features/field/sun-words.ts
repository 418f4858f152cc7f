import {
  nextTwilightChange,
  sunAltitudeDeg,
  twilightOfAltitude,
  type Twilight,
} from '@harkmoor/sync-model/radio/sun/sun';
import type { Position } from '@harkmoor/sync-model/radio/position';
import { figureText, utcHourMinute } from '../../platform/utc-text';

const NAMES: Readonly<Record<Twilight, { falling: string; rising: string }>> = {
  day: { falling: 'Day', rising: 'Day' },
  civil: { falling: 'Dusk', rising: 'Dawn' },
  nautical: { falling: 'Nautical dusk', rising: 'Nautical dawn' },
  astronomical: { falling: 'Late dusk', rising: 'First dawn' },
  night: { falling: 'Night', rising: 'Night' },
};
const MINUTE_MS = 60_000;

/** The sun at a place: "Dusk", "sun −4°", "ends 19:43" (UTC). The last is empty in polar day and night. */
export function sunWords(
  position: Position,
  atMs: number,
): { state: string; altitude: string; next: string } {
  const altitudeDeg = sunAltitudeDeg(position, atMs);
  const isRising = sunAltitudeDeg(position, atMs + MINUTE_MS) > altitudeDeg;
  const twilight = twilightOfAltitude(altitudeDeg);
  const change = nextTwilightChange(position, atMs);
  const verb = twilight === 'day' ? 'sets' : change?.to === 'day' ? 'sunrise' : 'ends';
  return {
    state: NAMES[twilight][isRising ? 'rising' : 'falling'],
    altitude: `sun ${figureText(altitudeDeg)}°`,
    next: change ? `${verb} ${utcHourMinute(change.atMs)}` : '',
  };
}
