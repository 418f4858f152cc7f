import type { ReactNode } from 'react';
import { ButtonLink } from '../../design/button/ButtonLink';
import { EmptyState } from '../../design/states/EmptyState';
import { ErrorState } from '../../design/states/ErrorState';
import { paths } from '../../platform/paths';
import { figureText } from '../../platform/utc-text';
import type { Overview } from './answers/questions';
import { useAnswer, useWatchEvidence } from './data/use-evidence';
import './coverage.css';

/** Shows its content once the receptions are counted, and what to do where there is nothing to show. */
export function OverviewGate({ children }: { readonly children: (overview: Overview) => ReactNode }) {
  useWatchEvidence();
  const state = useAnswer({ kind: 'overview' });
  if (state.kind === 'reading') {
    return (
      <p className="cov-reading soft" role="status">
        Counting the receptions on this device…
      </p>
    );
  }
  if (state.kind === 'failed') {
    return (
      <div className="cov-state">
        <ErrorState
          title="The receptions could not be counted"
          sentence="They are still on this device. Close other tabs of Harkmoor and open this screen again."
          detail={state.message}
        />
      </div>
    );
  }
  const { receptions, observations } = state.answer;
  if (observations > 0) return children(state.answer);
  return (
    <div className="cov-state">
      {receptions === 0 ? (
        <EmptyState
          title="No coverage yet"
          sentence="The map fills with what you log: each target heard, and each one not heard. Start an outing and work through a list."
          action={<ButtonLink to={paths.field()}>Go to Field</ButtonLink>}
        />
      ) : (
        <EmptyState
          title="No tries yet"
          sentence={`${figureText(receptions)} receptions are here, but none is a try: only frequencies chosen before listening, in a round or planned, count in a heard rate.`}
          action={<ButtonLink to={paths.field()}>Go to Field</ButtonLink>}
        />
      )}
    </div>
  );
}
