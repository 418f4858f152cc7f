import { useState } from 'react';
import { useIonRouter } from '@ionic/react';
import { useSearchParams } from 'react-router-dom';
import { SETUPS_PER_OUTING_MAX } from '@harkmoor/sync-model/records/outing-from-start';
import { Button } from '../../design/button/Button';
import { ButtonLink } from '../../design/button/ButtonLink';
import { ChoiceChips } from '../../design/choice/ChoiceChips';
import { ManyChips } from '../../design/choice/ManyChips';
import { Section } from '../../design/layout/Section';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';
import { useOwnOutings } from './data/running-outing';
import { useFieldActions } from './data/use-field-actions';
import { Cautions } from './ui/Cautions';
import { useAct } from './use-act';
import { useStartChoice, type StartWishes } from './use-start-choice';
import { othersSee } from './words';
import './ui/field.css';

const NO_LIST = 'none';

/** Where, with what and what for: the choices of the next outing. `?site=` chooses a site that was just made. */
export function StartOutingPage() {
  const router = useIonRouter();
  const [search] = useSearchParams();
  const outings = useOwnOutings();
  const [wishes, setWishes] = useState<StartWishes>({ siteId: search.get('site') ?? undefined });
  const choice = useStartChoice(outings?.newest ?? null, wishes);
  const actions = useFieldActions();
  const act = useAct();
  const wish = (change: StartWishes): void => setWishes((known) => ({ ...known, ...change }));
  if (outings === undefined || choice === null) return <Frame>{null}</Frame>;
  const { site, setups, list, start } = choice;
  const go = async (): Promise<void> => {
    if (start && (await act(() => actions.startOuting(start, Date.now())))) {
      router.push(paths.field(), 'back', 'pop');
    }
  };
  return (
    <Frame
      foot={
        <div className="fd-start-foot">
          <Button wide disabled={start === null} onClick={() => void go()}>
            {start === null ? 'Choose a site and a setup' : 'Start the outing'}
          </Button>
        </div>
      }
    >
      <Section
        title="Site"
        aside={
          <ButtonLink look="quiet" to={paths.newSite()}>
            New site
          </ButtonLink>
        }
      >
        <ChoiceChips
          label="Site"
          hideLabel
          options={choice.sites.map(({ id, name }) => ({ value: id, label: name }))}
          value={site?.id ?? null}
          onChange={(id) => wish({ siteId: id ?? undefined })}
        />
        <p className="fd-see" role="status">
          {site
            ? `Others will see ${othersSee(site.place)}.`
            : 'No site yet: make one with a position or a locator.'}
        </p>
      </Section>
      <Section
        title="Setups"
        aside={
          <ButtonLink look="quiet" to={paths.newSetup()}>
            New setup
          </ButtonLink>
        }
      >
        <ManyChips
          label={`Taken along, up to ${SETUPS_PER_OUTING_MAX}`}
          options={setups.offered.map(({ id, label }) => ({ value: id, label }))}
          value={setups.taken.map(({ id }) => id)}
          onChange={(ids) => wish({ setupIds: ids.slice(0, SETUPS_PER_OUTING_MAX) })}
        />
        {setups.taken.length > 1 ? (
          <ChoiceChips
            label="In use at the start"
            options={setups.taken.map(({ id, label }) => ({ value: id, label }))}
            value={setups.current?.id ?? null}
            onChange={(id) => wish({ currentSetupId: id ?? undefined })}
          />
        ) : null}
      </Section>
      <Section
        title="Target list"
        aside={
          <ButtonLink look="quiet" to={paths.targetLists()}>
            Lists
          </ButtonLink>
        }
      >
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
          value={list?.id ?? NO_LIST}
          onChange={(id) => wish({ targetListId: id === NO_LIST ? null : id })}
        />
      </Section>
      {outings.running ? (
        <p className="fd-see">The outing that still runs ends when this one starts.</p>
      ) : null}
      <Cautions />
    </Frame>
  );
}

function Frame(props: { readonly children: React.ReactNode; readonly foot?: React.ReactNode }) {
  return (
    <PageFrame title="Start an outing" back={{ to: paths.field(), label: 'Field' }} foot={props.foot}>
      <div className="fd">{props.children}</div>
    </PageFrame>
  );
}
