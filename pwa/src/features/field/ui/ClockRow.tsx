import { useMemo } from 'react';
import type { ClockTrust } from '@harkmoor/sync-model/evidence/clock-trust';
import type { Position } from '@harkmoor/sync-model/radio/position';
import { UtcClock } from '../../../design/clock/UtcClock';
import { nextTheme, setTheme, useTheme } from '../../../design/theme/theme';
import { sunWords } from '../sun-words';
import { clockWords } from '../words';
import './clock-row.css';

type ClockRowProps = {
  readonly trust: ClockTrust;
  readonly minuteMs: number;
  /** By the clock check where it is trusted. */
  readonly trueMs: number;
  readonly position: Position | null;
  readonly onCheck: () => void;
};

/** The large UTC clock with what its checks say of it, the sun at the site, and the theme key. */
export function ClockRow({ trust, minuteMs, trueMs, position, onCheck }: ClockRowProps) {
  const { text, isWarning } = clockWords(trust, minuteMs);
  const aheadMs = trust.kind === 'checked' ? -trust.check.offsetMs : 0;
  return (
    <div className="fd-clock">
      <UtcClock aheadMs={aheadMs} />
      <div className="fd-clock-side">
        {position ? <Sun position={position} atMs={trueMs} /> : null}
        <ThemeKey />
      </div>
      <button type="button" className={isWarning ? 'fd-check fd-check-warn' : 'fd-check'} onClick={onCheck}>
        <span className="num">
          {isWarning ? <b aria-hidden="true">! </b> : null}
          UTC · {text}
        </span>
        {isWarning ? <u>Check</u> : <span className="only-heard">. Check</span>}
      </button>
    </div>
  );
}

function Sun({ position, atMs }: { position: Position; atMs: number }) {
  const { latDeg, lonDeg } = position;
  const sun = useMemo(() => sunWords({ latDeg, lonDeg }, atMs), [latDeg, lonDeg, atMs]);
  return (
    <div className="fd-sun num">
      <strong>{sun.state}</strong>
      <span>{sun.next ? `${sun.altitude} · ${sun.next}` : sun.altitude}</span>
    </div>
  );
}

const THEME_WORDS = { day: 'day', dusk: 'dusk', 'red-night': 'red night' } as const;

function ThemeKey() {
  const theme = useTheme();
  const next = nextTheme(theme);
  return (
    <button
      type="button"
      className="fd-theme"
      aria-label={`Theme: ${THEME_WORDS[theme]}. Change to ${THEME_WORDS[next]}`}
      onClick={() => setTheme(next)}
    >
      <svg width="24" height="24" viewBox="0 0 24 24" aria-hidden="true">
        <circle cx="12" cy="12" r="8.5" fill="none" stroke="currentColor" strokeWidth="2" />
        <path
          d={theme === 'red-night' ? 'M12 3.5a8.5 8.5 0 0 1 0 17' : 'M12 3.5a8.5 8.5 0 0 0 0 17Z'}
          fill={theme === 'day' ? 'none' : 'currentColor'}
          stroke="currentColor"
          strokeWidth="2"
        />
      </svg>
    </button>
  );
}
