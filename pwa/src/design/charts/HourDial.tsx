import { useId, useState, type KeyboardEvent } from 'react';
import { rampOf, textOnRamp } from '../scale/cividis';
import { useTheme, type Theme } from '../theme/theme';
import { DialRim, type RimPart } from './DialRim';
import { cellPath, pointAt, ringRadii, type DialPoint } from './dial-geometry';
import { steppedCell, type CellAt } from './dial-keys';
import './charts.css';

export type DialCellFigure = {
  /** 0–1; null where there is no figure. */
  readonly share: number | null;
  readonly isThin: boolean;
  /** True where something was tried, though too little for a figure. */
  readonly isTried: boolean;
  /** The figure with its sample, for whoever reads the cell. */
  readonly words: string;
};
/** A band or a channel: one cell for each UTC hour, 0 to 23. */
export type DialRingFigures = {
  readonly key: string;
  readonly label: string;
  readonly cells: readonly DialCellFigure[];
};

type HourDialProps = {
  /** What the dial is of, for screen readers: "Hour dial of JO46ac". */
  readonly label: string;
  /** In the middle, in large and in small. */
  readonly title: string;
  readonly note: string;
  /** From the middle outwards. */
  readonly rings: readonly DialRingFigures[];
  readonly rim: readonly RimPart[];
};

const HALF = 170;
const INNER = 50;
const OUTER = 142;
const GAP = 0.8;

/**
 * The round 24-hour chart: UTC around the rim with noon at the top, bands or channels as rings, the sun at the
 * place on the rim. Each cell can be read by pointer and by arrow keys: the line below says its figure.
 */
export function HourDial({ label, title, note, rings, rim }: HourDialProps) {
  const theme = useTheme();
  const hintId = useId();
  const [at, setAt] = useState<CellAt | null>(null);
  const ring = at && rings[at.ring];
  const cell = at && ring?.cells[at.hour];
  const words = at && ring && cell ? cellWords(ring.label, at.hour, cell.words) : '';
  const press = (event: KeyboardEvent): void => {
    const next = steppedCell(at, event.key, rings.length);
    if (!next) return;
    event.preventDefault();
    setAt(next);
  };
  return (
    <div className="hm-dial">
      <div
        className="hm-dial-keys"
        role="application"
        tabIndex={0}
        aria-label={label}
        aria-describedby={hintId}
        onKeyDown={press}
        onPointerLeave={() => setAt(null)}
      >
        <svg viewBox={`${-HALF} ${-HALF} ${HALF * 2} ${HALF * 2}`} aria-hidden="true">
          <DialRim parts={rim} radius={OUTER + 8} textRadius={OUTER + 20} />
          {rings.map((each, index) => (
            <RingCells
              key={each.key}
              ring={each}
              index={index}
              count={rings.length}
              theme={theme}
              readHour={at?.ring === index ? at.hour : null}
              onRead={(hour) => setAt({ ring: index, hour })}
            />
          ))}
          <text className="hm-dial-title" textAnchor="middle" y="-1">
            {title}
          </text>
          <text className="hm-dial-note num" textAnchor="middle" y="16">
            {note}
          </text>
        </svg>
      </div>
      <p className="hm-dial-words num" role="status">
        {words}
      </p>
      <p id={hintId} className="only-heard">
        Left and right move through the hours, up and down through the rings. The same figures stand in the
        table below.
      </p>
    </div>
  );
}

type RingCellsProps = {
  readonly ring: DialRingFigures;
  readonly index: number;
  readonly count: number;
  readonly theme: Theme;
  readonly readHour: number | null;
  readonly onRead: (hour: number) => void;
};

function RingCells({ ring, index, count, theme, readHour, onRead }: RingCellsProps) {
  const [inner, outer] = ringRadii(index, count, INNER, OUTER);
  const ramp = rampOf(theme);
  const isPrinted = theme === 'red-night' && outer - inner >= 9;
  return ring.cells.map(({ share, isThin, isTried }, hour) => {
    const shape = { fromHour: hour, toHour: hour + 1, inner, outer };
    const middle = pointAt((inner + outer) / 2, hour + 0.5);
    return (
      <g key={hour} onPointerEnter={() => onRead(hour)} onPointerDown={() => onRead(hour)}>
        <path className="hm-dial-empty" d={cellPath(shape, GAP, false)} />
        {share === null && isTried ? (
          <circle className="hm-dial-tried" cx={middle.x} cy={middle.y} r="1.6" />
        ) : null}
        {share !== null && !(isPrinted && isThin) ? (
          <path d={cellPath(shape, GAP, isThin)} fill={ramp(share)} />
        ) : null}
        {share !== null && isPrinted ? <PrintedTens share={share} isThin={isThin} at={middle} /> : null}
        {readHour === hour ? <path className="hm-dial-read" d={cellPath(shape, 0, false)} /> : null}
      </g>
    );
  });
}

type PrintedTensProps = { readonly share: number; readonly isThin: boolean; readonly at: DialPoint };

/** In red night: the rate in tens; a thin one has no ground, for its cell is smaller than a figure. */
function PrintedTens({ share, isThin, at }: PrintedTensProps) {
  return (
    <text
      className={isThin ? 'hm-dial-print hm-dial-print-thin' : 'hm-dial-print'}
      x={at.x}
      y={at.y + 4}
      style={{ fill: isThin ? 'var(--soft-ink)' : textOnRamp(share, 'red-night') }}
    >
      {Math.round(share * 10)}
    </text>
  );
}

/** "49 m broadcast, 15–16 UTC: 83 % heard, 58 of 70". */
function cellWords(ringLabel: string, hour: number, words: string): string {
  const two = (each: number) => String(each).padStart(2, '0');
  return `${ringLabel}, ${two(hour)}–${two((hour + 1) % 24)} UTC: ${words}`;
}
