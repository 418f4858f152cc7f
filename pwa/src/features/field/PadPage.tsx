import { useEffect, useMemo, useState } from 'react';
import { useLocation } from 'react-router-dom';
import { ButtonLink } from '../../design/button/ButtonLink';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { PATTERNS, paths } from '../../platform/paths';
import { usePadStart } from './data/use-pad-log';
import { padAddress } from './pad-address';
import { PadScreen } from './PadScreen';
import { useGoToField } from './use-go-to-field';

/** The score pad: opened by *Heard*, by *Same again*, or to edit an entry. */
export function PadPage() {
  const search = useOwnSearch();
  const address = useMemo(() => padAddress(search), [search]);
  const start = usePadStart(address);
  const goToField = useGoToField();
  const isSaved = start?.kind === 'saved';
  useEffect(() => {
    if (isSaved) goToField();
  }, [isSaved, goToField]);
  if (start?.kind === 'ready') return <PadScreen key={search} start={start} />;
  // no frame before it is known which: the outlet takes each new frame for a page that was just opened
  if (start?.kind !== 'gone') return null;
  return (
    <PageFrame title="Score pad" back={{ to: paths.field(), label: 'Field' }}>
      <EmptyState
        title="Nothing to score here"
        sentence={start.sentence}
        action={<ButtonLink to={paths.field()}>To Field</ButtonLink>}
      />
    </PageFrame>
  );
}

/** The query of this page's own address: while another page slides over it, the address is already that one's. */
function useOwnSearch(): string {
  const location = useLocation();
  const [search, setSearch] = useState(location.search);
  const isOwn = location.pathname === PATTERNS.pad;
  if (isOwn && location.search !== search) {
    setSearch(location.search);
    return location.search;
  }
  return search;
}
