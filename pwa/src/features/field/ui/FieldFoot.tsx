import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { formatFrequency } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { SegmentedControl } from '../../../design/choice/SegmentedControl';
import { paths } from '../../../platform/paths';
import type { SetupChoice } from '../data/gear';
import './field-foot.css';

type FieldFootProps = {
  /** What was just done, with *Undo*, or a question; nothing above the keys otherwise. */
  readonly line: ReactNode;
  readonly setups: readonly SetupChoice[];
  readonly currentSetupId: string;
  readonly onSetup: (setupId: string) => void;
  readonly onMoreSetups: () => void;
  readonly sameAgainHz: number | null;
  readonly onSameAgain: () => void;
};

/** In reach of the thumb: the setup in use, another frequency, the last signal once more. */
export function FieldFoot(props: FieldFootProps) {
  const { setups, currentSetupId, sameAgainHz } = props;
  const again = sameAgainHz === null ? null : formatFrequency(sameAgainHz);
  return (
    <div className="fd-foot">
      {props.line}
      <SegmentedControl
        label="Setup from now on"
        options={setups.map(({ id, label }) => ({ value: id, label }))}
        value={currentSetupId}
        onChange={props.onSetup}
        extra={
          <button
            type="button"
            className="fd-more-setups"
            aria-label="Setups: add or mend"
            onClick={props.onMoreSetups}
          >
            +
          </button>
        }
      />
      <div className="fd-enter">
        <Link to={paths.frequency()} className="fd-other">
          Other frequency, kHz
        </Link>
        {again ? (
          <button type="button" className="fd-again num" onClick={props.onSameAgain}>
            Same again
            <br />
            {again.figure}
            {again.unit === 'MHz' ? ' MHz' : ''}
          </button>
        ) : null}
      </div>
    </div>
  );
}
