import { EmptyState } from '../../../design/states/EmptyState';
import { useReception } from '../data/use-reception';
import { ReceptionView } from './ReceptionView';
import { receptionTitle } from './title-words';
import './record.css';

/** The right half of the logbook on a laptop: the record that is open, or how to open one. */
export function BesidePane({ openId }: { readonly openId: string | null }) {
  const held = useReception(openId ?? undefined);
  return (
    <aside className="log-beside" aria-label="Reception" tabIndex={0}>
      {openId === null || held === null ? (
        <EmptyState
          title={openId === null ? 'No reception is open' : 'Not on this device'}
          sentence={
            openId === null
              ? 'Choose a row to see all that is known of it. Arrow keys move, Enter opens.'
              : 'This reception is not in the log that is shown.'
          }
        />
      ) : held === undefined ? null : (
        <>
          <div className="log-beside-title">
            <h2>{receptionTitle(held).title}</h2>
            <p className="hm-subtitle num">{receptionTitle(held).subtitle}</p>
          </div>
          <ReceptionView key={openId} held={held} />
        </>
      )}
    </aside>
  );
}
