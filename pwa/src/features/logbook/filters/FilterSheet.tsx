import { useState } from 'react';
import { Button } from '../../../design/button/Button';
import { ChoiceChips } from '../../../design/choice/ChoiceChips';
import { SelectField, type Option } from '../../../design/form/SelectField';
import { TextField } from '../../../design/form/TextField';
import { Sheet } from '../../../design/sheet/Sheet';
import type { Choice, LogChoices } from '../index/log-choices';
import type { LogFilter, StateChoice } from '../index/log-filter';
import { readDate, widened } from '../view/filter-query';

type FilterSheetProps = {
  readonly isOpen: boolean;
  readonly filter: LogFilter;
  readonly choices: LogChoices | null;
  /** "34 of 6 012 receptions". */
  readonly countWords: string;
  readonly onChange: (filter: Partial<LogFilter>) => void;
  readonly onClose: () => void;
};

export const OUTCOME_OPTIONS: readonly Option<LogFilter['outcome'] & string>[] = [
  { value: 'heard', label: 'Heard' },
  { value: 'nil', label: 'Nil' },
  { value: 'skipped', label: 'Skipped' },
];

export const STATE_OPTIONS: readonly Option<StateChoice>[] = [
  { value: 'only-here', label: 'Only here' },
  { value: 'sent', label: 'Sent' },
  { value: 'needs-attention', label: 'Needs attention' },
];

/** What narrows the log; each choice holds at once, and the list behind follows. */
export function FilterSheet({ isOpen, filter, choices, countWords, onChange, onClose }: FilterSheetProps) {
  const { search: _search, ...nothing } = widened(filter);
  return (
    <Sheet
      isOpen={isOpen}
      title="Filter the log"
      onClose={onClose}
      foot={
        <div className="hm-sheet-acts">
          <Button look="outline" onClick={() => onChange(nothing)}>
            Take all off
          </Button>
          <Button onClick={onClose}>Show {countWords}</Button>
        </div>
      }
    >
      <ChoiceChips
        label="Outcome"
        options={OUTCOME_OPTIONS}
        value={filter.outcome}
        clearable
        onChange={(outcome) => onChange({ outcome })}
      />
      <ChoiceChips
        label="State"
        options={STATE_OPTIONS}
        value={filter.state}
        clearable
        onChange={(state) => onChange({ state })}
      />
      <OneOf label="Band" list={choices?.bands} value={filter.band} onChange={(band) => onChange({ band })} />
      <OneOf
        label="Station"
        list={choices?.stations}
        value={filter.station}
        onChange={(station) => onChange({ station })}
      />
      <OneOf
        label="Antenna"
        list={choices?.antennas}
        value={filter.antennaId}
        onChange={(antennaId) => onChange({ antennaId })}
      />
      <OneOf
        label="Site"
        list={choices?.sites}
        value={filter.siteId}
        onChange={(siteId) => onChange({ siteId })}
      />
      <OneOf
        label="Operator"
        list={choices?.operators}
        value={filter.operatorId}
        onChange={(operatorId) => onChange({ operatorId })}
      />
      <DateField
        label="From, UTC date"
        value={filter.fromDate}
        onChange={(fromDate) => onChange({ fromDate })}
      />
      <DateField label="To, UTC date" value={filter.toDate} onChange={(toDate) => onChange({ toDate })} />
    </Sheet>
  );
}

type OneOfProps = {
  readonly label: string;
  readonly list: readonly Choice[] | undefined;
  readonly value: string | null;
  readonly onChange: (value: string | null) => void;
};

function OneOf({ label, list, value, onChange }: OneOfProps) {
  return (
    <SelectField
      label={label}
      required
      emptyLabel="All"
      options={list ?? []}
      value={value ?? ''}
      disabled={list === undefined}
      onChange={(chosen: string) => onChange(chosen === '' ? null : chosen)}
    />
  );
}

type DateFieldProps = {
  readonly label: string;
  readonly value: string | null;
  readonly onChange: (value: string | null) => void;
};

function DateField({ label, value, onChange }: DateFieldProps) {
  const [text, setText] = useState(value ?? '');
  const [told, setTold] = useState(value);
  if (told !== value) {
    setTold(value);
    if (value !== readDate(text)) setText(value ?? '');
  }
  const isWrong = text !== '' && readDate(text) === null;
  return (
    <TextField
      label={label}
      required
      figures
      placeholder="2026-11-12"
      maxLength={10}
      error={isWrong && text.length === 10 ? 'This is no date. Type year, month and day: 2026-11-12.' : null}
      hint="Year-month-day"
      value={text}
      onChange={(next) => {
        setText(next);
        onChange(readDate(next));
      }}
    />
  );
}
