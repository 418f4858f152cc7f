const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];
const DAY_MS = 86_400_000;

export function isMonthKey(text: string): boolean {
  return /^\d{4}-(0[1-9]|1[0-2])$/.test(text);
}

/** "Nov 2026". */
export function monthWords(monthKey: string): string {
  return `${monthName(monthKey)} ${monthKey.slice(0, 4)}`;
}

/** "Nov–Feb", "Nov", "Nov, Jan–Feb" with the year where more than one year's same month could be meant. */
export function monthsWords(monthKeys: readonly string[]): string {
  const sorted = [...monthKeys].sort();
  const isLong = sorted.length > 0 && monthNumber(sorted.at(-1)!) - monthNumber(sorted[0]!) >= 12;
  const name = isLong ? monthWords : monthName;
  return runsOf(sorted)
    .map(([from, to]) => (from === to ? name(from) : `${name(from)}–${name(to)}`))
    .join(', ');
}

/** The start, in ms UTC, of the day in the middle of the months from the first to the last; null for none. */
export function middleDayMs(monthKeys: readonly string[]): number | null {
  const sorted = [...monthKeys].sort();
  const [first, last] = [sorted[0], sorted.at(-1)];
  if (first === undefined || last === undefined) return null;
  const [year = 0, month = 1] = last.split('-').map(Number);
  const fromMs = Date.parse(`${first}-01T00:00:00Z`);
  const days = Math.round((Date.UTC(year, month, 1) - fromMs) / DAY_MS);
  return fromMs + Math.floor(days / 2) * DAY_MS;
}

function runsOf(sorted: readonly string[]): [string, string][] {
  const runs: [string, string][] = [];
  for (const key of sorted) {
    const run = runs.at(-1);
    if (run && monthNumber(key) === monthNumber(run[1]) + 1) run[1] = key;
    else runs.push([key, key]);
  }
  return runs;
}

function monthName(monthKey: string): string {
  return MONTHS[Number(monthKey.slice(5)) - 1] ?? monthKey;
}

function monthNumber(monthKey: string): number {
  return Number(monthKey.slice(0, 4)) * 12 + Number(monthKey.slice(5));
}
