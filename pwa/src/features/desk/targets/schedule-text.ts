import type { Schedule, ScheduleSlot } from '@harkmoor/sync-model/records/target';

const DAY_WORDS = ['Mo', 'Tu', 'We', 'Th', 'Fr', 'Sa', 'Su'];

/** '04:00–20:00 Mo–Fr; 09:00–12:00 Sa Su', or 'always'. */
export function scheduleText(schedule: Schedule): string {
  return schedule === 'always' ? 'always' : schedule.map(slotText).join('; ');
}

function slotText({ from, to, days }: ScheduleSlot): string {
  const span = `${from}–${to === '00:00' && from !== '00:00' ? '24:00' : to}`;
  return days.length === 7 ? span : `${span} ${daysText(days)}`;
}

export function daysText(days: readonly number[]): string {
  const sorted = [...days].sort();
  const [first, last] = [sorted[0] ?? 1, sorted.at(-1) ?? 1];
  const isRun = sorted.length > 2 && last - first === sorted.length - 1;
  if (isRun) return `${DAY_WORDS[first - 1]}–${DAY_WORDS[last - 1]}`;
  return sorted.map((day) => DAY_WORDS[day - 1]).join(' ');
}
