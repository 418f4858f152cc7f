/** Narrow no-break space: between thousands, and between a figure and its unit. */
export const THIN_SPACE = '\u202f';
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];
const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;
const DAY_MS = 24 * HOUR_MS;

/** '18:42:07', UTC. `atMs`: ms UTC. The screen says "UTC" beside it. */
export function utcTime(atMs: number): string {
  return new Date(atMs).toISOString().slice(11, 19);
}

/** '18:42', UTC. */
export function utcHourMinute(atMs: number): string {
  return new Date(atMs).toISOString().slice(11, 16);
}

/** '1 Dec 2026', the UTC date. */
export function utcDate(atMs: number): string {
  const date = new Date(atMs);
  return `${date.getUTCDate()} ${MONTHS[date.getUTCMonth()]} ${date.getUTCFullYear()}`;
}

/** '1 Dec', for lines where the year is plain. */
export function shortDate(atMs: number): string {
  const date = new Date(atMs);
  return `${date.getUTCDate()} ${MONTHS[date.getUTCMonth()]}`;
}

/** '2026-12-01', the UTC date as it sorts. */
export function isoDate(atMs: number): string {
  return new Date(atMs).toISOString().slice(0, 10);
}

/** '1 Dec 2026, 18:42 UTC'. */
export function utcDateTime(atMs: number): string {
  return `${utcDate(atMs)}, ${utcHourMinute(atMs)} UTC`;
}

/** The largest fitting unit, rounded down: '42 s', '7 min', '2 h', '3 days'. */
export function durationWords(ms: number): string {
  const length = Math.abs(ms);
  if (length < MINUTE_MS) return `${Math.floor(length / 1000)}${THIN_SPACE}s`;
  if (length < HOUR_MS) return `${Math.floor(length / MINUTE_MS)}${THIN_SPACE}min`;
  if (length < 2 * DAY_MS) return `${Math.floor(length / HOUR_MS)}${THIN_SPACE}h`;
  return `${Math.floor(length / DAY_MS)} days`;
}

/** 'just now', '7 min ago', 'in 2 h'. */
export function agoWords(atMs: number, nowMs: number): string {
  if (Math.abs(nowMs - atMs) < MINUTE_MS) return 'just now';
  const words = durationWords(nowMs - atMs);
  return atMs > nowMs ? `in ${words}` : `${words} ago`;
}

/** The time where it was today (UTC), else date and time: 'Sent 14:05', 'Sent 30 Nov, 14:05'. */
export function timeOrDate(atMs: number, nowMs: number): string {
  return isoDate(atMs) === isoDate(nowMs)
    ? utcHourMinute(atMs)
    : `${shortDate(atMs)}, ${utcHourMinute(atMs)}`;
}

/** Thin spaces between thousands, a true minus: '11 730', '−85', '5 000.2'. */
export function figureText(value: number, decimals = 0): string {
  const [whole = '0', rest] = Math.abs(value).toFixed(decimals).split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, THIN_SPACE);
  const isNegative = value < 0 && Number(Math.abs(value).toFixed(decimals)) !== 0;
  return `${isNegative ? '\u2212' : ''}${grouped}${rest === undefined ? '' : `.${rest}`}`;
}

/** A figure with its unit and a thin space between: '862 km'. */
export function withUnit(value: number, unit: string, decimals = 0): string {
  return `${figureText(value, decimals)}${THIN_SPACE}${unit}`;
}
