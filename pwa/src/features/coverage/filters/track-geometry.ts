import { isAllHours, type HourRange } from '../view/hour-range';

/** A stretch of the track as shares of its width, 0–1. */
export type TrackBox = { readonly from: number; readonly to: number };

/** Where a range lies on a track from 0 to 24 h; one that runs over midnight lies at both ends. None for all hours. */
export function handleBoxes(range: HourRange): TrackBox[] {
  if (isAllHours(range)) return [];
  const from = range.fromUtc / 24;
  const to = from + range.lengthH / 24;
  return to <= 1
    ? [{ from, to }]
    : [
        { from, to: 1 },
        { from: 0, to: to - 1 },
      ];
}

/** The range of the same length whose middle is nearest to a place on the track; one hour where all were shown. */
export function rangeAtShare(share: number, range: HourRange): HourRange {
  const lengthH = isAllHours(range) ? 1 : range.lengthH;
  const middle = Math.max(0, Math.min(1, share)) * 24;
  const fromUtc = Math.round(middle - lengthH / 2);
  const highest = lengthH === 1 ? 23 : 24;
  return { fromUtc: ((Math.min(fromUtc, highest) % 24) + 24) % 24, lengthH };
}
