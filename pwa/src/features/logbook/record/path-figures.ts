import { pathBetween, type Path } from '@harkmoor/sync-model/radio/path/path';
import { sharedPath, sharedPosition } from '@harkmoor/sync-model/radio/path/shared-path';
import type { Position } from '@harkmoor/sync-model/radio/position';
import { figureText, withUnit } from '../../../platform/utc-text';
import type { HeldReception } from '../data/held-reception';

/** From where the path and the sun are computed: the owner's exact fix, or what others see of the place. */
export type Standpoint = {
  readonly position: Position;
  readonly isExact: boolean;
  readonly words: string;
};

/** Null where neither the fix nor the site is on this device. */
export function standpointOf({ siteFix, site }: Pick<HeldReception, 'siteFix' | 'site'>): Standpoint | null {
  if (siteFix) {
    const { latDeg, lonDeg, accuracyM } = siteFix.fix;
    const words = `from your exact fix, ±${withUnit(Math.round(accuracyM), 'm')}`;
    return { position: { latDeg, lonDeg }, isExact: true, words };
  }
  if (!site?.place) return null;
  const { place } = site;
  const words =
    'locator' in place
      ? `from the middle of square ${place.locator}`
      : 'from the point that its owner shares';
  return { position: sharedPosition(place), isExact: false, words };
}

/** The path to the transmitter; null where either end is not known. */
export function pathOf(held: Pick<HeldReception, 'siteFix' | 'site' | 'target'>): Path | null {
  const tx = held.target?.tx;
  if (!tx) return null;
  if (held.siteFix) return pathBetween(held.siteFix.fix, tx);
  return held.site?.place ? sharedPath(held.site.place, tx) : null;
}

/** "98°", never 360. */
export function bearingText(bearingDeg: number): string {
  return `${Math.round(bearingDeg) % 360}°`;
}

/** "55.4712° N, 8.2034° E". */
export function positionText({ latDeg, lonDeg }: Position): string {
  const lat = `${figureText(Math.abs(latDeg), 4)}° ${latDeg < 0 ? 'S' : 'N'}`;
  return `${lat}, ${figureText(Math.abs(lonDeg), 4)}° ${lonDeg < 0 ? 'W' : 'E'}`;
}
