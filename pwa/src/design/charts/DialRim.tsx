import { arcPath, pointAt } from './dial-geometry';

/** A stretch of the day at one place, in UTC hours; `toHour` may lie past 24. */
export type RimPart = {
  readonly fromHour: number;
  readonly toHour: number;
  readonly light: 'day' | 'twilight' | 'night';
};

type DialRimProps = {
  readonly parts: readonly RimPart[];
  readonly radius: number;
  readonly textRadius: number;
};

const LABELLED_HOURS = [0, 3, 6, 9, 12, 15, 18, 21];

/** The rim of the dial: a thin line by day, a thicker one at twilight, a thick one at night, and the hours. */
export function DialRim({ parts, radius, textRadius }: DialRimProps) {
  return (
    <>
      {parts.map(({ fromHour, toHour, light }) => (
        <path
          key={fromHour}
          className={`hm-dial-rim hm-dial-rim-${light}`}
          d={arcPath(radius, fromHour, toHour)}
        />
      ))}
      {LABELLED_HOURS.map((hour) => {
        const { x, y } = pointAt(textRadius, hour);
        return (
          <text key={hour} className="hm-dial-hour num" textAnchor="middle" x={x} y={y + 4}>
            {String(hour).padStart(2, '0')}
          </text>
        );
      })}
    </>
  );
}
