import { ChoiceChips } from '../../../design/choice/ChoiceChips';
import { TextField } from '../../../design/form/TextField';
import { rstOf } from '../rst-parts';
import type { PadForm } from '../use-pad-form';
import { ProgrammeField } from './ProgrammeField';
import { RstKeys } from './RstKeys';

export type PartName = 'station' | 'remark' | 'programme' | 'rst';

const IDENTITIES = [
  { value: 'sure', label: 'Sure' },
  { value: 'tentative', label: 'Tentative' },
  { value: 'unknown', label: 'Unknown' },
] as const;

/** One part of an entry that is opened when it is wanted. */
export function PadPart({ part, form }: { readonly part: PartName; readonly form: PadForm }) {
  const { values, change } = form;
  const hasTone = values.mode === 'CW';
  switch (part) {
    case 'remark':
      return (
        <TextField
          label="Remark"
          lines={3}
          maxLength={4000}
          value={values.remarks}
          onChange={(remarks) => change({ remarks })}
        />
      );
    case 'programme':
      return <ProgrammeField form={form} />;
    case 'station':
      return (
        <>
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
        </>
      );
    case 'rst':
      return (
        <RstKeys
          parts={values.rstParts}
          outlined={form.outlined.rst}
          hasTone={hasTone}
          onParts={(rstParts) => {
            change({ rstParts });
            form.changeScores({ rst: rstOf(rstParts, hasTone) });
          }}
        />
      );
  }
}
