import { useEffect, useMemo, useState } from 'react';
import { useIonViewDidLeave, useIonViewWillEnter } from '@ionic/react';
import { useLocation } from 'react-router-dom';
import { ButtonLink } from '../../design/button/ButtonLink';
import { EmptyState } from '../../design/states/EmptyState';
import { PATTERNS, paths } from '../../platform/paths';
import { usePadStart } from './data/use-pad-log';
import { padAddress } from './pad-address';
import { PadScreen } from './PadScreen';
import { FieldFrame } from './ui/FieldFrame';
import { LockKey } from './ui/LockKey';
import { RainLock, useRainLock } from './ui/RainLock';
import { useGoToField } from './use-go-to-field';

/**
 * The score pad: opened by *Heard*, by *Same again*, or to edit an entry. The outlet keeps a page alive after it
 * was left, so what is on it is put away at each leaving: a draft is then kept or dropped at once, and read again
 * at a return.
 */
export function PadPage() {
  const search = useOwnSearch();
  const [title, setTitle] = useState('Score pad');
  const [isShown, setShown] = useState(true);
  const rain = useRainLock();
  useIonViewWillEnter(() => setShown(true));
  useIonViewDidLeave(() => setShown(false));
  return (
    <FieldFrame
      title={title}
      back={{ to: paths.field(), label: 'Field' }}
      actions={<LockKey onLock={rain.lock} />}
    >
      {isShown ? <Pad key={search} search={search} onTitle={setTitle} /> : null}
      {isShown && rain.isLocked ? <RainLock onOpen={rain.unlock} /> : null}
    </FieldFrame>
  );
}

function Pad({ search, onTitle }: { readonly search: string; readonly onTitle: (title: string) => void }) {
  const address = useMemo(() => padAddress(search), [search]);
  const start = usePadStart(address);
  const goToField = useGoToField();
  const isSaved = start?.kind === 'saved';
  useEffect(() => {
    if (isSaved) goToField();
  }, [isSaved, goToField]);
  if (start?.kind === 'ready') return <PadScreen start={start} onTitle={onTitle} />;
  if (start?.kind !== 'gone') return null;
  return (
    <EmptyState
      title="Nothing to score here"
      sentence={start.sentence}
      action={<ButtonLink to={paths.field()}>To Field</ButtonLink>}
    />
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
