import { useState } from 'react';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import { Button } from '../../design/button/Button';
import { ChoiceChips } from '../../design/choice/ChoiceChips';
import type { SetupChoice } from './data/gear';
import { FrequencyMend } from './ui/FrequencyMend';
import { ModeChips } from './ui/ModeChips';
import { OutcomeChoice } from './ui/OutcomeChoice';
import { PadPart, type PartName } from './ui/PadPart';
import { TimeMend } from './ui/TimeMend';
import type { PadForm } from './use-pad-form';
import './ui/pad-details.css';

type PadDetailsProps = {
  readonly form: PadForm;
  readonly base: Reception;
  readonly setups: readonly SetupChoice[];
  /** Present where the entry is stored already. */
  readonly onBin?: () => void;
};

const RST_MODES: readonly Reception['tuning']['mode'][] = ['CW', 'USB', 'LSB', 'DSB', 'FM'];

/** Mode and time, and what is opened when it is wanted: station, programme details, remark, RST. */
export function PadDetails({ form, base, setups, onBin }: PadDetailsProps) {
  const { values, change } = form;
  return (
    <>
      <ModeChips mode={values.mode} onMode={form.changeMode} />
      <Parts form={form} />
      <TimeMend
        outcome={values.outcome}
        atMs={values.atMs}
        tappedMs={base.deviceAt}
        onTime={(atMs) => change({ atMs })}
      />
      {values.isEdit ? <StoredParts form={form} setups={setups} /> : null}
      {values.isEdit ? null : <OutcomeChoice form={form} basis={base.basis} />}
      {onBin ? (
        <Button look="danger" onClick={onBin}>
          Move to the bin
        </Button>
      ) : null}
    </>
  );
}

function Parts({ form }: { readonly form: PadForm }) {
  const { values } = form;
  const [open, setOpen] = useState<ReadonlySet<PartName>>(() => filledParts(form));
  const isHeard = values.outcome === 'heard';
  const offersRst = isHeard && (RST_MODES.includes(values.mode) || open.has('rst'));
  const parts: [PartName, string, boolean][] = [
    ['remark', 'Remark', true],
    ['programme', 'Programme', isHeard],
    ['station', 'Station', isHeard],
    ['rst', 'RST', offersRst],
  ];
  const offered = parts.filter(([, , isOffered]) => isOffered);
  const toggle = (part: PartName): void =>
    setOpen((known) => {
      const next = new Set(known);
      if (!next.delete(part)) next.add(part);
      return next;
    });
  return (
    <>
      <div className="fd-parts">
        {offered.map(([part, label]) => (
          <button
            key={part}
            type="button"
            className="fd-part"
            aria-expanded={open.has(part)}
            onClick={() => toggle(part)}
          >
            {label} {open.has(part) ? '−' : '+'}
          </button>
        ))}
      </div>
      {offered.map(([part]) => (open.has(part) ? <PadPart key={part} part={part} form={form} /> : null))}
    </>
  );
}

/** What only a stored entry may need put right: its dial and its setup. */
function StoredParts({ form, setups }: Pick<PadDetailsProps, 'form' | 'setups'>) {
  const { values, change } = form;
  const offered = setups.filter(({ id, isRetired }) => !isRetired || id === values.setupId);
  return (
    <>
      <FrequencyMend dialHz={values.dialHz} onFrequency={(dialHz) => change({ dialHz })} />
      {offered.length > 1 ? (
        <ChoiceChips
          label="Setup"
          options={offered.map(({ id, label }) => ({ value: id, label }))}
          value={values.setupId}
          onChange={(setupId) => setupId !== null && change({ setupId })}
        />
      ) : null}
    </>
  );
}

function filledParts({ values, outlined }: PadForm): Set<PartName> {
  const parts = new Set<PartName>();
  if (values.remarks) parts.add('remark');
  if (values.programme.length > 0 || values.programmeText) parts.add('programme');
  if (values.stationName || values.identity === 'tentative') parts.add('station');
  if (Object.keys(values.rstParts).length > 0 || outlined.rst) parts.add('rst');
  return parts;
}
