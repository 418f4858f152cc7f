/** UTC hours in a row; from 23 it goes on at 0. Twenty-four of them are all hours, wherever they begin. */
export type HourRange = {
  /** 0–23, UTC. */
  readonly fromUtc: number;
  /** 1–24. */
  readonly lengthH: number;
};

export const ALL_HOURS: HourRange = { fromUtc: 0, lengthH: 24 };
/** What the length of a range may be set to. */
export const RANGE_LENGTHS_H = [1, 2, 3, 4, 6, 12, 24] as const;

export function isAllHours({ lengthH }: HourRange): boolean {
  return lengthH >= 24;
}

/** The UTC hours of a range in their order: 22, 23, 0. */
export function hoursOf({ fromUtc, lengthH }: HourRange): number[] {
  return Array.from({ length: Math.min(lengthH, 24) }, (_, step) => (fromUtc + step) % 24);
}

/** The range that begins so many hours later or earlier, round the clock. */
export function movedBy(range: HourRange, hours: number): HourRange {
  return { ...range, fromUtc: (((range.fromUtc + hours) % 24) + 24) % 24 };
}

/** "15:00–16:00 UTC" or "All hours". */
export function rangeWords(range: HourRange): string {
  if (isAllHours(range)) return 'All hours';
  return `${clock(range.fromUtc)}–${clock((range.fromUtc + range.lengthH) % 24)} UTC`;
}

/** "15–16 UTC", for a line with more in it. */
export function shortRangeWords(range: HourRange): string {
  if (isAllHours(range)) return 'all hours';
  return `${two(range.fromUtc)}–${two((range.fromUtc + range.lengthH) % 24)} UTC`;
}

/** "15", "14-17" (the end not included) or "all", for an address. */
export function rangeCode(range: HourRange): string {
  if (isAllHours(range)) return 'all';
  const end = (range.fromUtc + range.lengthH) % 24;
  return range.lengthH === 1 ? String(range.fromUtc) : `${range.fromUtc}-${end}`;
}

/** Reads what `rangeCode` made; all hours for any other text. */
export function readRangeCode(code: string | null): HourRange {
  const [, from = '', end] = /^(\d{1,2})(?:-(\d{1,2}))?$/.exec(code ?? '') ?? [];
  const fromUtc = Number(from);
  const endUtc = end === undefined ? (fromUtc + 1) % 24 : Number(end);
  if (from === '' || fromUtc > 23 || endUtc > 23 || endUtc === fromUtc) return ALL_HOURS;
  return { fromUtc, lengthH: (endUtc - fromUtc + 24) % 24 };
}

/** The hour in the middle of a range as a moment of the day, in ms since midnight UTC. */
export function middleOfDayMs({ fromUtc, lengthH }: HourRange): number {
  return (((fromUtc + lengthH / 2) % 24) * 3_600_000) | 0;
}

function clock(hour: number): string {
  return `${two(hour)}:00`;
}

function two(hour: number): string {
  return String(hour).padStart(2, '0');
}
