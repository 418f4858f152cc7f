import { sunAltitudeDeg, twilightOfAltitude, type Twilight } from '@harkmoor/sync-model/radio/sun/sun';
import type { Position } from '@harkmoor/sync-model/radio/position';
import { useEffect, useState } from 'react';
import { Section } from '../../../design/layout/Section';
import { figureText, withUnit } from '../../../platform/utc-text';
import type { HeldReception } from '../data/held-reception';
import { Facts, type Fact } from './Facts';
import { bearingText, pathOf, positionText, standpointOf } from './path-figures';

const TWILIGHT_WORDS: Readonly<Record<Twilight, string>> = {
  day: 'day',
  civil: 'civil twilight',
  nautical: 'nautical twilight',
  astronomical: 'astronomical twilight',
  night: 'night',
};

/** Where it was, the way to the transmitter, and the sun over the site at that time. */
export function PlaceSection({ held, atMs }: { readonly held: HeldReception; readonly atMs: number }) {
  const { site, siteFix, target } = held;
  const standpoint = standpointOf(held);
  const path = pathOf(held);
  const here = useMagnetic(path && standpoint ? standpoint.position : null, atMs, path?.bearingDeg ?? 0);
  const there = useMagnetic(path && target?.tx ? target.tx : null, atMs, path?.backBearingDeg ?? 0);
  const altitudeDeg = standpoint ? sunAltitudeDeg(standpoint.position, atMs) : null;
  const facts: (Fact | null)[] = [
    { name: 'Site', value: site?.name ?? 'Not on this device', note: site?.environment?.replace('-', ' ') },
    site?.place
      ? {
          name: 'Others see',
          value: 'locator' in site.place ? `square ${site.place.locator}` : positionText(site.place),
        }
      : null,
    siteFix
      ? {
          name: 'Exact fix',
          value: positionText(siteFix.fix),
          note: `±${withUnit(Math.round(siteFix.fix.accuracyM), 'm')}, yours alone`,
        }
      : null,
    path && standpoint
      ? {
          name: 'Path',
          value: `${withUnit(Math.round(path.distanceKm), 'km')}`,
          note: `${standpoint.words}; the long way ${withUnit(Math.round(path.longDistanceKm), 'km')}`,
        }
      : null,
    path ? { name: 'To the transmitter', value: `${bearingText(path.bearingDeg)} true`, note: here } : null,
    path ? { name: 'Back from it', value: `${bearingText(path.backBearingDeg)} true`, note: there } : null,
    altitudeDeg === null
      ? null
      : {
          name: 'Sun at the site',
          value: `${figureText(altitudeDeg, 1)}°`,
          note: TWILIGHT_WORDS[twilightOfAltitude(altitudeDeg)],
        },
  ];
  return (
    <Section title="Place and path">
      <Facts facts={facts} />
    </Section>
  );
}

/** What a compass shows for a true bearing there and then; the model comes after the screen stands. */
function useMagnetic(position: Position | null, atMs: number, trueDeg: number): string {
  const [words, setWords] = useState('');
  const latDeg = position?.latDeg;
  const lonDeg = position?.lonDeg;
  useEffect(() => {
    if (latDeg === undefined || lonDeg === undefined) return;
    let isWanted = true;
    import('@harkmoor/sync-model/radio/path/declination').then(
      ({ declinationDeg, magneticBearingDeg }) => {
        const found = declinationDeg({ latDeg, lonDeg }, atMs);
        const text =
          found.kind === 'known'
            ? `${bearingText(magneticBearingDeg(trueDeg, found.declinationDeg))} magnetic${found.weakField ? ', weak field' : ''}`
            : found.reason === 'model-expired'
              ? 'no magnetic model for that date'
              : 'a compass shows nothing there';
        if (isWanted) setWords(text);
      },
      (error: unknown) => {
        console.error('the magnetic model could not be loaded', error);
        if (isWanted) setWords('the magnetic model is not on this device');
      },
    );
    return () => {
      isWanted = false;
    };
  }, [latDeg, lonDeg, atMs, trueDeg]);
  return words;
}
