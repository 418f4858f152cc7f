import { useState } from 'react';
import { Button } from '../../../design/button/Button';
import { readPosition } from '../../../platform/position';
import { withUnit } from '../../../platform/utc-text';
import type { QuickPlace } from '../data/quick-start';
import { LocatorKeys } from './LocatorKeys';

const POSITION_LIMIT_MS = 20_000;

type PlaceEntryProps = {
  readonly place: QuickPlace | null;
  readonly onPlace: (place: QuickPlace | null) => void;
};

/** Where you are: the device's position by one tap, or a locator by our own keys. */
export function PlaceEntry({ place, onPlace }: PlaceEntryProps) {
  const [state, setState] = useState<{ kind: 'idle' | 'reading' } | { kind: 'refused'; message: string }>({
    kind: 'idle',
  });
  const [locator, setLocator] = useState('');
  const read = async (): Promise<void> => {
    setState({ kind: 'reading' });
    const answer = await readPosition(POSITION_LIMIT_MS);
    if (!answer.ok) return setState({ kind: 'refused', message: 'No position: type a locator below.' });
    const { latitudeDeg, longitudeDeg, accuracyM, atMs } = answer.fix;
    setState({ kind: 'idle' });
    setLocator('');
    const fix = {
      latDeg: latitudeDeg,
      lonDeg: longitudeDeg,
      accuracyM: Math.min(100_000, Math.max(0, Math.round(accuracyM))),
      source: 'live' as const,
      fixedAt: atMs,
    };
    onPlace({ kind: 'fix', fix });
  };
  const type = (text: string): void => {
    setLocator(text);
    onPlace(
      text.length >= 4 && text.length % 2 === 0 ? { kind: 'locator', locator: text, atMs: Date.now() } : null,
    );
  };
  return (
    <section className="fd-place" aria-label="Where you are">
      <Button
        look={place ? 'outline' : 'primary'}
        wide
        busy={state.kind === 'reading'}
        onClick={() => void read()}
      >
        {state.kind === 'reading' ? 'Finding the position…' : 'Use my position'}
      </Button>
      <p className="small" role="status">
        {state.kind === 'refused'
          ? state.message
          : place?.kind === 'fix'
            ? `Position found, good to ${withUnit(place.fix.accuracyM, 'm')}. It stays in your own log.`
            : 'or type the locator: JO46, or JO46ac to be nearer'}
      </p>
      <LocatorKeys text={locator} onText={type} />
    </section>
  );
}
