import { lazy, Suspense, useState } from 'react';
import { Button } from '../../../design/button/Button';
import { averagePosition, readPosition, type PositionAnswer } from '../../../platform/position';
import { fixFromLocator, type OwnFix } from '../data/site-record';
import { LocatorKeys } from '../ui/LocatorKeys';
import { fixText } from './site-words';

/** The map comes only when it is asked for. */
const PointMap = lazy(() => import('./PointMap').then((m) => ({ default: m.PointMap })));

const READ_LIMIT_MS = 20_000;
const AVERAGE_MS = 30_000;

type FixEntryProps = {
  readonly fix: OwnFix | null;
  readonly error: string | null;
  readonly onFix: (fix: OwnFix) => void;
};

type Way = 'position' | 'map' | 'locator';

/** The exact point: read by the device, once or as a mean, set on the map, or typed as a locator. */
export function FixEntry({ fix, error, onFix }: FixEntryProps) {
  const [way, setWay] = useState<Way>('position');
  const [note, setNote] = useState<string | null>(null);
  const [isBusy, setBusy] = useState(false);
  const [locator, setLocator] = useState('');

  async function take(reading: () => Promise<PositionAnswer>, source: 'live' | 'averaged'): Promise<void> {
    setBusy(true);
    setNote(source === 'averaged' ? 'Averaging for 30 s; keep the device still…' : 'Finding the position…');
    const answer = await reading();
    setBusy(false);
    if (!answer.ok) return setNote(answer.refusal.message);
    setNote(null);
    onFix(fixOf(answer.fix, source));
  }
  const type = (text: string): void => {
    setLocator(text);
    if (text.length >= 4 && text.length % 2 === 0) onFix(fixFromLocator(text, Date.now()));
  };
  return (
    <section className="fd-place" aria-label="Exact point">
      <p className="num" role="status">
        {note ??
          (fix
            ? `${fix.latDeg.toFixed(5)}, ${fix.lonDeg.toFixed(5)}: ${fixText(fix, Date.now())}`
            : 'No point yet')}
      </p>
      {error ? <p className="hm-error">! {error}</p> : null}
      <div className="site-ways">
        <Button
          look="outline"
          busy={isBusy}
          onClick={() => void take(() => readPosition(READ_LIMIT_MS), 'live')}
        >
          Use my position
        </Button>
        <Button
          look="outline"
          busy={isBusy}
          onClick={() => void take(() => averagePosition({ durationMs: AVERAGE_MS }), 'averaged')}
        >
          Average 30 s
        </Button>
        <Button
          look="outline"
          aria-expanded={way === 'map'}
          onClick={() => setWay(way === 'map' ? 'position' : 'map')}
        >
          On the map
        </Button>
        <Button
          look="outline"
          aria-expanded={way === 'locator'}
          onClick={() => setWay(way === 'locator' ? 'position' : 'locator')}
        >
          Type a locator
        </Button>
      </div>
      {way === 'locator' ? <LocatorKeys text={locator} onText={type} /> : null}
      {way === 'map' ? (
        <Suspense fallback={null}>
          <PointMap
            point={fix}
            onPoint={(point, accuracyM) => onFix({ ...point, accuracyM, source: 'map', fixedAt: Date.now() })}
          />
        </Suspense>
      ) : null}
    </section>
  );
}

function fixOf(fix: Extract<PositionAnswer, { ok: true }>['fix'], source: 'live' | 'averaged'): OwnFix {
  return {
    latDeg: fix.latitudeDeg,
    lonDeg: fix.longitudeDeg,
    accuracyM: Math.min(100_000, Math.max(0, Math.round(fix.accuracyM))),
    source,
    fixedAt: fix.atMs,
    ...(source === 'averaged' ? { averagedS: AVERAGE_MS / 1000 } : {}),
  };
}
