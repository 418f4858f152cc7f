import { useState, type ReactNode } from 'react';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import { Button } from '../../design/button/Button';
import { ChoiceChips } from '../../design/choice/ChoiceChips';
import { TextField } from '../../design/form/TextField';
import type { SetupChoice } from './data/gear';
import { FrequencyMend } from './ui/FrequencyMend';
import { ModeChips } from './ui/ModeChips';
import { OutcomeChoice } from './ui/OutcomeChoice';
import { ProgrammeField } from './ui/ProgrammeField';
import { RstKeys } from './ui/RstKeys';
import { TimeMend } from './ui/TimeMend';
import type { PadForm } from './use-pad-form';

type PadDetailsProps = {
  readonly form: PadForm;
  readonly base: Reception;
  readonly setups: readonly SetupChoice[];
  /** Present where the entry is stored already. */
  readonly onBin?: () => void;
};

type Part = 'station' | 'remark' | 'programme' | 'rst';
const IDENTITIES = [
  { value: 'sure', label: 'Sure' },
  { value: 'tentative', label: 'Tentative' },
  { value: 'unknown', label: 'Unknown' },
] as const;
const RST_MODES: readonly Reception['tuning']['mode'][] = ['CW', 'USB', 'LSB', 'DSB', 'FM'];

/** Mode and time, and what is opened when it is wanted: station, programme details, remark, RST. */
export function PadDetails({ form, base, setups, onBin }: PadDetailsProps) {
  const { values, change } = form;
  const isHeard = values.outcome === 'heard';
  const [open, setOpen] = useState<ReadonlySet<Part>>(() => filledParts(values));
  const toggle = (part: Part): void =>
    setOpen((parts) => {
      const next = new Set(parts);
      if (!next.delete(part)) next.add(part);
      return next;
    });
  const offersRst = isHeard && (RST_MODES.includes(values.mode) || open.has('rst'));
  const parts: [Part, string, boolean][] = [
    ['remark', 'Remark', true],
    ['programme', 'Programme', isHeard],
    ['station', 'Station', isHeard],
    ['rst', 'RST', offersRst],
  ];
  const taken = setups.filter(({ id, isRetired }) => !isRetired || id === values.setupId);
  return (
    <>
      <ModeChips mode={values.mode} onMode={(mode) => change({ mode })} />
      <div className="fd-parts">
        {parts.map(([part, label, isOffered]) =>
          isOffered ? (
            <button
              key={part}
              type="button"
              className="fd-part"
              aria-expanded={open.has(part)}
              onClick={() => toggle(part)}
            >
              {label} {open.has(part) ? '−' : '+'}
            </button>
          ) : null,
        )}
      </div>
      <Opened when={open.has('remark')}>
        <TextField
          label="Remark"
          lines={3}
          maxLength={4000}
          value={values.remarks}
          onChange={(remarks) => change({ remarks })}
        />
      </Opened>
      <Opened when={isHeard && open.has('programme')}>
        <ProgrammeField form={form} />
      </Opened>
      <Opened when={isHeard && open.has('station')}>
        <TextField
          label="Station heard"
          maxLength={80}
          value={values.stationName}
          onChange={(stationName) => change({ stationName })}
        />
        <ChoiceChips
          label="How sure is it?"
          options={IDENTITIES}
          value={values.identity}
          onChange={(identity) => identity !== null && change({ identity })}
        />
      </Opened>
      <Opened when={offersRst && open.has('rst')}>
        <RstKeys
          rst={values.scores.rst ?? null}
          hasTone={values.mode === 'CW'}
          onRst={(rst) => form.changeScores({ rst })}
        />
      </Opened>
      <TimeMend atMs={values.atMs} tappedMs={base.deviceAt} onTime={(atMs) => change({ atMs })} />
      {values.isEdit ? (
        <FrequencyMend dialHz={values.dialHz} onFrequency={(dialHz) => change({ dialHz })} />
      ) : null}
      {values.isEdit && taken.length > 1 ? (
        <ChoiceChips
          label="Setup"
          options={taken.map(({ id, label }) => ({ value: id, label }))}
          value={values.setupId}
          onChange={(setupId) => setupId !== null && change({ setupId })}
        />
      ) : null}
      {values.isEdit ? null : <OutcomeChoice form={form} basis={base.basis} />}
      {onBin ? (
        <Button look="danger" onClick={onBin}>
          Move to the bin
        </Button>
      ) : null}
    </>
  );
}

function Opened({ when, children }: { readonly when: boolean; readonly children: ReactNode }) {
  return when ? children : null;
}

function filledParts(values: PadForm['values']): Set<Part> {
  const parts = new Set<Part>();
  if (values.remarks) parts.add('remark');
  if (values.programme.length > 0 || values.programmeText) parts.add('programme');
  if (values.stationName || values.identity === 'tentative') parts.add('station');
  if (values.scores.rst) parts.add('rst');
  return parts;
}
