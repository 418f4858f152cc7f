import { useState } from 'react';
import type { DialRings } from '@harkmoor/sync-model/evidence/hour-dial';
import { ErrorState } from '../../../design/states/ErrorState';
import type { Overview } from '../answers/questions';
import { useAnswer } from '../data/use-evidence';
import type { CoverageView } from '../view/coverage-view';
import { evidenceQuestion, LISTED_AT_FIRST } from '../view/evidence-filters';
import { scopeWords } from '../view/scope-words';
import type { ChangeView } from '../view/use-coverage-view';
import { BestFrequencies } from './BestFrequencies';
import { HeadFigures } from './HeadFigures';
import { LeftOutList } from './LeftOutList';
import { ReceptionsBehind } from './ReceptionsBehind';
import { SquareDial } from './SquareDial';

type SquareEvidenceProps = {
  readonly view: CoverageView;
  readonly overview: Overview;
  readonly onChange: ChangeView;
  /** True where the page's own title and bar say what the figures are of. */
  readonly hideHead?: boolean;
};

/** The evidence of the chosen square, or of all squares together, down to the receptions behind it. */
export function SquareEvidence({ view, overview, onChange, hideHead = false }: SquareEvidenceProps) {
  const [rings, setRings] = useState<DialRings>('channels');
  const [listed, setListed] = useState(LISTED_AT_FIRST);
  const state = useAnswer(evidenceQuestion(view, overview, { rings, listed }));
  if (state.kind === 'reading') return <p className="soft">Counting…</p>;
  if (state.kind === 'failed') {
    return (
      <ErrorState
        title="The evidence could not be counted"
        sentence="The receptions are still on this device. Open this screen again."
        detail={state.message}
      />
    );
  }
  const { answer } = state;
  return (
    <div aria-busy={!state.isCurrent}>
      {hideHead ? null : (
        <header>
          <h2>{view.square === null ? 'All squares' : `Square ${view.square}`}</h2>
          <p className="soft small num">{scopeWords(view, overview)}</p>
          {view.square === null ? (
            <p className="soft small">Choose a square on the map to see its evidence alone.</p>
          ) : null}
        </header>
      )}
      <HeadFigures answer={answer} />
      <SquareDial view={view} overview={overview} dial={answer.dial} rings={rings} onRings={setRings} />
      <BestFrequencies
        choices={answer.choices}
        view={view}
        onChoose={(channelKey) => onChange({ subject: { kind: 'channel', key: channelKey } })}
      />
      <LeftOutList leftOut={answer.leftOut} />
      <ReceptionsBehind
        lines={answer.receptions}
        n={answer.rate.n}
        onMore={() => setListed((shown) => shown * 4)}
      />
    </div>
  );
}
