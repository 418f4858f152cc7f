import { useState } from 'react';
import { useIonRouter } from '@ionic/react';
import { useSearchParams } from 'react-router-dom';
import { SETUPS_PER_OUTING_MAX } from '@harkmoor/sync-model/records/outing-from-start';
import { Button } from '../../design/button/Button';
import { ButtonLink } from '../../design/button/ButtonLink';
import { ChoiceChips } from '../../design/choice/ChoiceChips';
import { ManyChips } from '../../design/choice/ManyChips';
import { Section } from '../../design/layout/Section';
import { paths } from '../../platform/paths';
import { useOwnOutings, type OwnOutings } from './data/running-outing';
import { useFieldActions } from './data/use-field-actions';
import { Cautions } from './ui/Cautions';
import { FieldFrame, InFoot } from './ui/FieldFrame';
import { withLabels } from './setup-labels';
import { useAct } from './use-act';
import { useFewFirst } from './use-few-first';
import { useStartChoice, type StartChoice, type StartWishes } from './use-start-choice';
import { othersSee } from './words';
import './ui/start.css';

const NO_LIST = 'none';

/** Where, with what and what for: the choices of the next outing. `?site=` chooses a site that was just made. */
export function StartOutingPage() {
  const outings = useOwnOutings();
  return (
    <FieldFrame title="Start an outing" back={{ to: paths.field(), label: 'Field' }}>
      {outings === undefined ? null : <Choices outings={outings} />}
    </FieldFrame>
  );
}

function Choices({ outings }: { readonly outings: OwnOutings }) {
  const router = useIonRouter();
  const [search] = useSearchParams();
  const [wishes, setWishes] = useState<StartWishes>({});
  const madeSiteId = search.get('site');
  const [seenSiteId, setSeenSiteId] = useState<string | null>(null);
  if (madeSiteId !== null && madeSiteId !== seenSiteId) {
    // made a moment ago from here: it is the one that was wanted, whatever was chosen before
    setSeenSiteId(madeSiteId);
    setWishes((known) => ({ ...known, siteId: madeSiteId }));
  }
  const choice = useStartChoice(outings.newest, wishes);
  const actions = useFieldActions();
  const act = useAct();
  if (choice === null) return null;
  const { start } = choice;
  const wish = (change: StartWishes): void => setWishes((known) => ({ ...known, ...change }));
  const go = async (): Promise<void> => {
    if (start && (await act(() => actions.startOuting(start, Date.now())))) {
      router.push(paths.field(), 'back', 'pop');
    }
  };
  return (
    <div className="fd">
      <SiteSection choice={choice} wish={wish} />
      <SetupSection choice={choice} wish={wish} />
      <ListSection choice={choice} wish={wish} />
      {outings.running ? (
        <p className="fd-see">The outing that still runs ends when this one starts.</p>
      ) : null}
      <Cautions />
      <InFoot>
        <div className="fd-start-foot">
          <Button wide disabled={start === null} onClick={() => void go()}>
            {start === null ? 'Choose a site and a setup' : 'Start the outing'}
          </Button>
        </div>
      </InFoot>
    </div>
  );
}

type SectionProps = { readonly choice: StartChoice; readonly wish: (change: StartWishes) => void };

function SiteSection({ choice, wish }: SectionProps) {
  const newSite = (
    <ButtonLink look="quiet" to={paths.newSite({ for: 'outing' })}>
      New site
    </ButtonLink>
  );
  const { shown, showRest } = useFewFirst(choice.sites, choice.site ? [choice.site.id] : []);
  return (
    <Section title="Site" aside={newSite}>
      <ChoiceChips
        label="Site"
        hideLabel
        options={shown.map(({ id, name }) => ({ value: id, label: name }))}
        value={choice.site?.id ?? null}
        onChange={(id) => wish({ siteId: id ?? undefined })}
      />
      {showRest ? (
        <Button look="quiet" onClick={showRest}>
          All {choice.sites.length} sites
        </Button>
      ) : null}
      <p className="fd-see" role="status">
        {choice.site
          ? `Others will see ${othersSee(choice.site.place)}.`
          : 'No site chosen: take one, or make one with a position or a locator.'}
      </p>
    </Section>
  );
}

function SetupSection({ choice: { setups }, wish }: SectionProps) {
  const newSetup = (
    <ButtonLink look="quiet" to={paths.newSetup()}>
      New setup
    </ButtonLink>
  );
  const takenIds = setups.taken.map(({ id }) => id);
  const { shown, showRest } = useFewFirst(setups.offered, takenIds);
  return (
    <Section title="Setups" aside={newSetup}>
      <ManyChips
        label={`Taken along, up to ${SETUPS_PER_OUTING_MAX}`}
        options={withLabels(shown).map(({ id, label }) => ({ value: id, label }))}
        value={takenIds}
        onChange={(ids) => wish({ setupIds: ids.slice(0, SETUPS_PER_OUTING_MAX) })}
      />
      {showRest ? (
        <Button look="quiet" onClick={showRest}>
          All {setups.offered.length} setups
        </Button>
      ) : null}
      {setups.taken.length > 1 ? (
        <ChoiceChips
          label="In use at the start"
          options={setups.taken.map(({ id, label }) => ({ value: id, label }))}
          value={setups.current?.id ?? null}
          onChange={(id) => wish({ currentSetupId: id ?? undefined })}
        />
      ) : null}
    </Section>
  );
}

function ListSection({ choice, wish }: SectionProps) {
  const lists = (
    <ButtonLink look="quiet" to={paths.targetLists()}>
      Lists
    </ButtonLink>
  );
  return (
    <Section title="Target list" aside={lists}>
      <ChoiceChips
        label="Target list"
        hideLabel
        options={[
          ...choice.lists.map(({ id, name, targetCount }) => ({
            value: id,
            label: `${name} · ${targetCount}`,
          })),
          { value: NO_LIST, label: 'None' },
        ]}
        value={choice.list?.id ?? NO_LIST}
        onChange={(id) => wish({ targetListId: id === NO_LIST ? null : id })}
      />
    </Section>
  );
}
