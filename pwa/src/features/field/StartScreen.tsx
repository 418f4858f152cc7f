import { useIonRouter } from '@ionic/react';
import { Button } from '../../design/button/Button';
import { ButtonLink } from '../../design/button/ButtonLink';
import { RowLink } from '../../design/layout/RowLink';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';
import type { StoredOuting } from './data/running-outing';
import { QuickStartForm } from './QuickStartForm';
import { Cautions } from './ui/Cautions';
import { DraftLine } from './ui/DraftLine';
import { ReadyLine } from './ui/ReadyLine';
import { useOpenDrafts } from './data/pad-drafts';
import { useFieldActions } from './data/use-field-actions';
import { useAct } from './use-act';
import { useStartChoice } from './use-start-choice';
import { othersSee } from './words';
import './ui/field.css';

/** Without an outing: the last site and setup and one button; or, with nothing yet, one form that is enough. */
export function StartScreen({ newest }: { readonly newest: StoredOuting | null }) {
  const choice = useStartChoice(newest, {});
  if (choice === null) {
    return (
      <PageFrame title="Field" hideTitle>
        {null}
      </PageFrame>
    );
  }
  if (choice.sites.length === 0 || choice.setups.offered.length === 0)
    return <QuickStartForm known={choice} />;
  return <ReadyToStart choice={choice} />;
}

function ReadyToStart({ choice }: { readonly choice: NonNullable<ReturnType<typeof useStartChoice>> }) {
  const { site, setups, list, start } = choice;
  const actions = useFieldActions();
  const act = useAct();
  const go = (): void => {
    if (start) void act(() => actions.startOuting(start, Date.now()));
  };
  return (
    <PageFrame
      title="Field"
      foot={
        <div className="fd-start-foot">
          <Drafts />
          <Button wide disabled={start === null} onClick={go}>
            {site ? `Start at ${site.name}` : 'Choose a site first'}
          </Button>
        </div>
      }
    >
      <div className="fd">
        <p className="fd-see">
          {site ? (
            <>
              Others will see this place as <b>{othersSee(site.place)}</b>.
            </>
          ) : (
            'Choose where you are.'
          )}
        </p>
        <RowLink to={paths.startOuting()} name={site?.name ?? 'No site chosen'} note="Site" />
        <RowLink
          to={paths.startOuting()}
          name={setups.taken.map(({ label }) => label).join(', ') || 'No setup chosen'}
          note={setups.taken.length > 1 ? `Setups; ${setups.current?.label ?? ''} first` : 'Setup'}
        />
        <RowLink
          to={paths.startOuting()}
          name={list ? list.name : 'No target list'}
          note={
            list
              ? `Target list · ${list.targetCount} targets`
              : 'Enter frequencies as you go, or choose a list'
          }
        />
        <Cautions />
        <ReadyLine />
        <nav className="fd-links" aria-label="Before you go">
          <ButtonLink look="quiet" to={paths.sites()}>
            Sites
          </ButtonLink>
          <ButtonLink look="quiet" to={paths.antennas()}>
            Setups and gear
          </ButtonLink>
          <ButtonLink look="quiet" to={paths.targetLists()}>
            Target lists
          </ButtonLink>
        </nav>
      </div>
    </PageFrame>
  );
}

function Drafts() {
  const router = useIonRouter();
  const actions = useFieldActions();
  const act = useAct();
  const draft = useOpenDrafts()?.[0];
  if (!draft) return null;
  return (
    <DraftLine
      draft={draft}
      onContinue={() => router.push(draft.values.path)}
      onDrop={() => void act(() => actions.dropDraft(draft.values.receptionId))}
    />
  );
}
