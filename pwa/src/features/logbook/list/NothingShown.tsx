import { Button } from '../../../design/button/Button';
import { ButtonLink } from '../../../design/button/ButtonLink';
import { EmptyState } from '../../../design/states/EmptyState';
import { ErrorState } from '../../../design/states/ErrorState';
import { paths } from '../../../platform/paths';
import type { LogViewState } from '../data/use-log-view';
import { narrowingCount, type LogFilter } from '../index/log-filter';

type NothingShownProps = {
  readonly state: LogViewState;
  readonly filter: LogFilter;
  readonly onWiden: () => void;
};

/** Stands where no row is shown: why, and what to do. */
export function NothingShown({ state, filter, onWiden }: NothingShownProps) {
  return (
    <div className="log-nothing">
      <Reason state={state} filter={filter} onWiden={onWiden} />
    </div>
  );
}

function Reason({ state, filter, onWiden }: NothingShownProps) {
  if (state.kind === 'failed') {
    return (
      <ErrorState
        title="The log could not be read"
        sentence="Nothing in it is lost. Close other tabs of Harkmoor and open this page again."
        detail={state.message}
      />
    );
  }
  if (state.kind === 'reading') return null;
  if (!state.view.isComplete) return <p className="soft">Nothing found yet. The log is still being read.</p>;
  if (filter.search !== '' || narrowingCount(filter) > 0) {
    return (
      <EmptyState
        title="Nothing matches"
        sentence="No reception on this device passes the search and the filters that hold."
        action={<Button onClick={onWiden}>Show everything</Button>}
      />
    );
  }
  if (filter.bin) {
    return (
      <EmptyState
        title="The bin is empty"
        sentence="What you delete lies here for 30 days and can be taken out again."
        action={<ButtonLink to={paths.logbook()}>To the logbook</ButtonLink>}
      />
    );
  }
  return (
    <EmptyState
      title="No receptions yet"
      sentence="Start an outing in Field. Each Heard and each Nil stands here from the moment you tap it, with signal or without."
      action={<ButtonLink to={paths.field()}>To Field</ButtonLink>}
    />
  );
}
