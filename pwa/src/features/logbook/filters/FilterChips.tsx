import type { Choice, LogChoices } from '../index/log-choices';
import type { LogFilter } from '../index/log-filter';
import { OUTCOME_OPTIONS, STATE_OPTIONS } from './FilterSheet';

type FilterChipsProps = {
  readonly filter: LogFilter;
  readonly choices: LogChoices | null;
  readonly onChange: (filter: Partial<LogFilter>) => void;
};

/** What narrows the list now, each to be taken off with one tap. */
export function FilterChips({ filter, choices, onChange }: FilterChipsProps) {
  const chips = chipsOf(filter, choices);
  if (chips.length === 0) return null;
  return (
    <ul className="log-chips" aria-label="Filters that hold">
      {chips.map(({ label, off }) => (
        <li key={label}>
          <button type="button" aria-label={`Take off ${label}`} onClick={() => onChange(off)}>
            {label} <span aria-hidden="true">×</span>
          </button>
        </li>
      ))}
    </ul>
  );
}

type Chip = { readonly label: string; readonly off: Partial<LogFilter> };

function chipsOf(filter: LogFilter, choices: LogChoices | null): Chip[] {
  const label = (list: readonly Choice[] | undefined, value: string, other: string): string =>
    list?.find((choice) => choice.value === value)?.label ?? other;
  const { outcome, state, band, station, antennaId, siteId, operatorId, fromDate, toDate } = filter;
  const chips: (Chip | null)[] = [
    outcome && { label: label(OUTCOME_OPTIONS, outcome, outcome), off: { outcome: null } },
    state && { label: label(STATE_OPTIONS, state, state), off: { state: null } },
    band && { label: label(choices?.bands, band, band), off: { band: null } },
    station && { label: station, off: { station: null } },
    antennaId && { label: label(choices?.antennas, antennaId, 'one antenna'), off: { antennaId: null } },
    siteId && { label: label(choices?.sites, siteId, 'one site'), off: { siteId: null } },
    operatorId && { label: label(choices?.operators, operatorId, 'one operator'), off: { operatorId: null } },
    fromDate && { label: `from ${fromDate}`, off: { fromDate: null } },
    toDate && { label: `to ${toDate}`, off: { toDate: null } },
  ] as (Chip | null)[];
  return chips.filter((chip) => chip !== null && typeof chip === 'object');
}
