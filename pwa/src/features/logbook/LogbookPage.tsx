import { useState } from 'react';
import { ButtonLink } from '../../design/button/ButtonLink';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';
import { useLogClient } from './data/use-log-client';
import { useLogChoices } from './data/use-log-choices';
import { useLogView, type LogViewState } from './data/use-log-view';
import { useClubId } from './data/use-club';
import { FilterChips } from './filters/FilterChips';
import { FilterSheet } from './filters/FilterSheet';
import { SearchBar } from './filters/SearchBar';
import { narrowingCount, type LogFilter } from './index/log-filter';
import { LogList } from './list/LogList';
import { LogTable } from './list/LogTable';
import { NothingShown } from './list/NothingShown';
import { BesidePane } from './record/BesidePane';
import { widened } from './view/filter-query';
import { countText } from './view/row-words';
import { useIsWide } from './view/use-is-wide';
import { useLogFilter } from './view/use-log-filter';
import './logbook.css';

/** All receptions of the club on this device, newest first; the bin is the same list of what was deleted. */
export function LogbookPage() {
  const place = useLogFilter();
  const { filter, change } = place;
  const [typed, setTyped] = useState<{ search: string; over: string } | null>(null);
  // what is typed is looked for at once; the address follows when the typing rests
  const search = typed && typed.over === filter.search ? typed.search : filter.search;
  const client = useLogClient();
  const state = useLogView(client, { ...filter, search });
  const [isFiltering, setFiltering] = useState(false);
  const narrowing = narrowingCount(filter);
  const choices = useLogChoices(client, isFiltering || narrowing > 0);
  const isWide = useIsWide();
  const words = countWords(state);
  return (
    <PageFrame
      title={filter.bin ? 'Bin' : 'Logbook'}
      back={filter.bin ? { to: paths.logbook(), label: 'Logbook' } : undefined}
      subtitle={
        <span role="status" className="num">
          {words.line}
        </span>
      }
      actions={
        filter.bin ? null : (
          <ButtonLink to={paths.logbook({ bin: 1 })} look="quiet">
            Bin
          </ButtonLink>
        )
      }
      scrolls={false}
      wide
    >
      <div className={isWide ? 'log-page log-page-wide' : 'log-page'}>
        <div className="log-main">
          <SearchBar
            search={filter.search}
            onType={(text) => setTyped({ search: text, over: filter.search })}
            onSettle={(text) => change({ search: text })}
            narrowing={narrowing}
            onFilters={() => setFiltering(true)}
          />
          <FilterChips filter={filter} choices={choices} onChange={change} />
          <Shown
            state={state}
            filter={{ ...filter, search }}
            isWide={isWide}
            openId={place.openId}
            rowTo={place.withOpen}
            onWiden={() => change(widened(filter))}
          />
        </div>
        {isWide ? <BesidePane openId={place.openId} /> : null}
      </div>
      <FilterSheet
        isOpen={isFiltering}
        filter={filter}
        choices={choices}
        countWords={words.short}
        onChange={change}
        onClose={() => setFiltering(false)}
      />
    </PageFrame>
  );
}

type ShownProps = {
  readonly state: LogViewState;
  readonly filter: LogFilter;
  readonly isWide: boolean;
  readonly openId: string | null;
  readonly rowTo: (id: string) => string;
  readonly onWiden: () => void;
};

function Shown({ state, filter, isWide, openId, rowTo, onWiden }: ShownProps) {
  const clubId = useClubId();
  if (state.kind !== 'ready' || state.view.shownCount === 0) {
    return <NothingShown state={state} filter={filter} onWiden={onWiden} />;
  }
  // another filter is another list, which begins at its top
  const key = JSON.stringify(filter);
  return isWide ? (
    <LogTable key={key} state={state} clubId={clubId} openId={openId} rowTo={rowTo} />
  ) : (
    <LogList key={key} state={state} clubId={clubId} />
  );
}

/** The line under the title, and what the key of the filters says. */
function countWords(state: LogViewState): { line: string; short: string } {
  if (state.kind === 'failed') return { line: '', short: 'the log' };
  if (state.kind === 'reading') return { line: 'Reading the log', short: 'the log' };
  const { shownCount, ofCount, isComplete, readCount, heldCount } = state.view;
  const short = countText(shownCount, ofCount);
  if (isComplete) return { line: short, short };
  return { line: `${short} · ${readCount} of ${heldCount} read so far`, short };
}
