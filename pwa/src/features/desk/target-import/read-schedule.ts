import type { ScheduleSlot } from '@harkmoor/sync-model/records/target';

const EVERY_DAY = [1, 2, 3, 4, 5, 6, 7];
const DAY_NUMBERS: Record<string, number> = { mo: 1, tu: 2, we: 3, th: 4, fr: 5, sa: 6, su: 7 };
const WEEKDAYS = /^(weekdays|mo-fr|1-5)$/;
const DAILY = /^(|daily|every day|all|always|1-7|mo-su)$/;

export type Read<T> = { ok: true; value: T } | { ok: false; message: string };

/** '04:00', '0400', '4:00' as HH:MM; '24:00' is the end of a day, 00:00. */
export function readTimeOfDay(text: string): Read<string> {
  const match = /^(\d{1,2}):?(\d{2})(?:\s*(?:utc|z))?$/i.exec(text.trim());
  const [hour, minute] = [Number(match?.[1]), Number(match?.[2])];
  if (!match || hour > 24 || minute > 59 || (hour === 24 && minute > 0)) {
    return { ok: false, message: `“${text}” is no UTC time such as 04:00 or 0400` };
  }
  return { ok: true, value: `${String(hour % 24).padStart(2, '0')}:${String(minute).padStart(2, '0')}` };
}

/** '0400-2000' as from and to. */
export function readHours(text: string): Read<{ from: string; to: string }> {
  const [first, second, ...rest] = text.trim().split(/\s*[-–]\s*/);
  if (first === undefined || second === undefined || rest.length > 0) {
    return { ok: false, message: `“${text}” is no range of hours such as 0400-2000` };
  }
  const from = readTimeOfDay(first);
  const to = readTimeOfDay(second);
  if (!from.ok) return from;
  if (!to.ok) return to;
  return { ok: true, value: { from: from.value, to: to.value } };
}

/** 'daily', 'Mo-Fr', 'Sa Su', '1,3,5' as ISO weekdays, 1 Monday to 7 Sunday; empty is daily. */
export function readDays(text: string): Read<number[]> {
  const plain = text.trim().toLowerCase();
  if (DAILY.test(plain)) return { ok: true, value: EVERY_DAY };
  if (WEEKDAYS.test(plain)) return { ok: true, value: [1, 2, 3, 4, 5] };
  const days = new Set<number>();
  for (const part of plain.split(/[\s,;]+/)) {
    const [from, to = from] = part.split('-').map(dayNumber);
    if (!from || !to) return { ok: false, message: `“${text}” names no days such as Mo-Fr or 1,3,5` };
    for (let day = from; ; day = (day % 7) + 1) {
      days.add(day);
      if (day === to) break;
    }
  }
  return { ok: true, value: [...days].sort() };
}

function dayNumber(text: string): number | undefined {
  if (/^[1-7]$/.test(text)) return Number(text);
  return DAY_NUMBERS[text.slice(0, 2)];
}

export function sameSlot(a: ScheduleSlot, b: ScheduleSlot): boolean {
  return a.from === b.from && a.to === b.to && a.days.join() === b.days.join();
}
