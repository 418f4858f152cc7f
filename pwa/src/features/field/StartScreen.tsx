import { Button } from '../../design/button/Button';
import { ButtonLink } from '../../design/button/ButtonLink';
import { RowLink } from '../../design/layout/RowLink';
import { paths } from '../../platform/paths';
import type { StoredOuting } from './data/running-outing';
import { useFieldActions } from './data/use-field-actions';
import { OpenDraft } from './OpenDraft';
import { QuickStartForm } from './QuickStartForm';
import { Cautions } from './ui/Cautions';
import { InFoot } from './ui/FieldFrame';
import { ReadyLine } from './ui/ReadyLine';
import { useAct } from './use-act';
import { useStartChoice, type StartChoice } from './use-start-choice';
import { othersSee } from './words';
import './ui/start.css';

/** Without an outing: the last site and setup and one button; or, with nothing yet, one form that is enough. */
export function StartScreen({ newest }: { readonly newest: StoredOuting | null }) {
  const choice = useStartChoice(newest, {});
  if (choice === null) return null;
  if (choice.sites.length === 0 || choice.setups.offered.length === 0) {
    return <QuickStartForm known={choice} />;
  }
  return <ReadyToStart choice={choice} />;
}

function ReadyToStart({ choice }: { readonly choice: StartChoice }) {
  const { site, start } = choice;
  const actions = useFieldActions();
  const act = useAct();
  const go = (): void => {
    if (start) void act(() => actions.startOuting(start, Date.now()));
  };
  return (
    <div className="fd">
      <OpenDraft />
      <h2 className="fd-head">{site ? `Out at ${site.name} again?` : 'Where are you listening?'}</h2>
      <p className="fd-see">
        {site ? (
          <>
            Others will see this place as <b>{othersSee(site.place)}</b>.
          </>
        ) : (
          'Choose a site, or make one.'
        )}
      </p>
      <ChoiceRows choice={choice} />
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
      <InFoot>
        <div className="fd-start-foot">
          {start ? (
            <Button wide onClick={go}>
              Start the outing
            </Button>
          ) : (
            <ButtonLink wide to={paths.startOuting()}>
              Choose site and setup
            </ButtonLink>
          )}
        </div>
      </InFoot>
    </div>
  );
}

function ChoiceRows({ choice }: { readonly choice: StartChoice }) {
  const { site, setups, list } = choice;
  const taken = setups.taken.map(({ label }) => label).join(', ');
  return (
    <>
      <RowLink to={paths.startOuting()} name={site?.name ?? 'No site chosen'} note="Site" />
      <RowLink
        to={paths.startOuting()}
        name={taken || 'No setup chosen'}
        note={setups.taken.length > 1 ? `Setups; ${setups.current?.label ?? ''} first` : 'Setup'}
      />
      <RowLink
        to={paths.startOuting()}
        name={list ? list.name : 'No target list'}
        note={list ? `Target list · ${list.targetCount} targets` : 'Enter frequencies, or choose a list'}
      />
    </>
  );
}
