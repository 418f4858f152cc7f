import type { Mode } from '@harkmoor/sync-model/records/common-fields';
import { ChoiceChips } from '../../../design/choice/ChoiceChips';

/** The five of the drawing first; the schema, which knows them too, stays out of the first chunk. */
const MODES_IN_ORDER: readonly Mode[] = ['AM', 'USB', 'LSB', 'CW', 'FM', 'SAM', 'DSB', 'digital', 'other'];

type ModeChipsProps = {
  readonly mode: Mode;
  readonly onMode: (mode: Mode) => void;
};

/** The mode, in one line that scrolls sideways. */
export function ModeChips({ mode, onMode }: ModeChipsProps) {
  return (
    <ChoiceChips
      label="Mode"
      hideLabel
      oneLine
      options={MODES_IN_ORDER.map((one) => ({ value: one, label: one }))}
      value={mode}
      onChange={(value) => value !== null && onMode(value)}
    />
  );
}
