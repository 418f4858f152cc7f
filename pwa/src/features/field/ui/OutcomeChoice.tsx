import type { Reception } from '@harkmoor/sync-model/records/reception';
import { ChoiceChips } from '../../../design/choice/ChoiceChips';
import { NIL_REASONS_IN_ORDER } from '../nil-reasons';
import type { PadForm } from '../use-pad-form';
import { NIL_REASON_WORDS } from '../words';

const OUTCOMES = [
  { value: 'heard', label: 'Heard' },
  { value: 'nil', label: 'Nil' },
  { value: 'skipped', label: 'Skipped' },
] as const;

/** Heard after all, or not: what was answered can be put right. A chance find was heard, or it would not be one. */
export function OutcomeChoice({
  form,
  basis,
}: {
  readonly form: PadForm;
  readonly basis: Reception['basis'];
}) {
  const { values, change } = form;
  if (basis === 'chance' || basis === 'swap') return null;
  return (
    <>
      <ChoiceChips
        label="Answer"
        options={basis === 'round' ? OUTCOMES : OUTCOMES.slice(0, 2)}
        value={values.outcome}
        onChange={(outcome) => outcome !== null && change({ outcome })}
      />
      {values.outcome === 'nil' ? (
        <ChoiceChips
          label="Nil, because of"
          clearable
          options={NIL_REASONS_IN_ORDER.map((reason) => ({ value: reason, label: NIL_REASON_WORDS[reason] }))}
          value={values.nilReason}
          onChange={(nilReason) => change({ nilReason })}
        />
      ) : null}
    </>
  );
}
