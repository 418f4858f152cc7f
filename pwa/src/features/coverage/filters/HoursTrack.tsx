import { useRef, type KeyboardEvent, type PointerEvent } from 'react';
import type { RimPart } from '../../../design/charts/DialRim';
import { ALL_HOURS, isAllHours, movedBy, rangeWords, type HourRange } from '../view/hour-range';
import { lightAtHour } from '../view/sun-parts';
import { handleBoxes, rangeAtShare } from './track-geometry';
import './hours.css';

type HoursTrackProps = {
  readonly range: HourRange;
  readonly onChange: (range: HourRange) => void;
  /** Day and night along the track; empty where there is no place or date to tell them for. */
  readonly sun: readonly RimPart[];
};

/** The 24 UTC hours as a track: a finger slides the range, arrow keys step it, Escape shows all hours. */
export function HoursTrack({ range, onChange, sun }: HoursTrackProps) {
  const track = useRef<HTMLDivElement>(null);
  const slideTo = (event: PointerEvent): void => {
    const box = track.current?.getBoundingClientRect();
    if (!box || box.width === 0) return;
    const next = rangeAtShare((event.clientX - box.left) / box.width, range);
    if (next.fromUtc !== range.fromUtc || next.lengthH !== range.lengthH) onChange(next);
  };
  const begin = (event: PointerEvent<HTMLDivElement>): void => {
    event.currentTarget.setPointerCapture(event.pointerId);
    slideTo(event);
  };
  const press = (event: KeyboardEvent): void => {
    const next = steppedRange(range, event.key);
    if (!next) return;
    event.preventDefault();
    onChange(next);
  };
  return (
    <div
      ref={track}
      className="cov-track"
      role="slider"
      tabIndex={0}
      aria-label="First UTC hour"
      aria-valuemin={0}
      aria-valuemax={23}
      aria-valuenow={range.fromUtc}
      aria-valuetext={spokenRange(range, sun)}
      onKeyDown={press}
      onPointerDown={begin}
      onPointerMove={(event) => event.buttons === 1 && slideTo(event)}
    >
      <div className="cov-track-bar">
        {sun.map(({ fromHour, toHour, light }) => (
          <i key={fromHour} className={`cov-track-${light}`} style={placed(fromHour / 24, toHour / 24)} />
        ))}
      </div>
      {isAllHours(range) ? <b className="cov-track-all" /> : null}
      {handleBoxes(range).map(({ from, to }) => (
        <b key={from} className="cov-track-handle" style={placed(from, to)} />
      ))}
    </div>
  );
}

function placed(from: number, to: number) {
  return { left: `${from * 100}%`, width: `${(to - from) * 100}%` };
}

/** What a key makes of a range; null for keys that are none of the track's. */
export function steppedRange(range: HourRange, key: string): HourRange | null {
  const shown = isAllHours(range) ? { fromUtc: range.fromUtc, lengthH: 1 } : range;
  switch (key) {
    case 'ArrowRight':
    case 'ArrowUp':
      return isAllHours(range) ? shown : movedBy(shown, 1);
    case 'ArrowLeft':
    case 'ArrowDown':
      return movedBy(shown, -1);
    case 'PageUp':
      return movedBy(shown, 3);
    case 'PageDown':
      return movedBy(shown, -3);
    case 'Home':
      return { ...shown, fromUtc: 0 };
    case 'End':
      return { ...shown, fromUtc: 23 };
    case 'Escape':
      return isAllHours(range) ? null : ALL_HOURS;
    default:
      return null;
  }
}

function spokenRange(range: HourRange, sun: readonly RimPart[]): string {
  if (isAllHours(range)) return 'All hours';
  const light = lightAtHour(sun, (range.fromUtc + range.lengthH / 2) % 24);
  return light ? `${rangeWords(range)}, ${light}` : rangeWords(range);
}
