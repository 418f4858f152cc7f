import { useState } from 'react';
import { useIonRouter } from '@ionic/react';
import type { Antenna } from '@harkmoor/sync-model/records/antenna';
import type { Site } from '@harkmoor/sync-model/records/site';
import { Button } from '../../design/button/Button';
import { ChoiceChips } from '../../design/choice/ChoiceChips';
import { TextField } from '../../design/form/TextField';
import { paths } from '../../platform/paths';
import { askToPersist } from '../../platform/storage-persistence';
import { sharedPlaceOf, type QuickPlace } from './data/quick-start';
import { useFieldActions } from './data/use-field-actions';
import { Cautions } from './ui/Cautions';
import { InFoot } from './ui/FieldFrame';
import { PlaceEntry } from './ui/PlaceEntry';
import { ReadyLine } from './ui/ReadyLine';
import { useAct } from './use-act';
import type { StartChoice } from './use-start-choice';
import { othersSee } from './words';
import './ui/start.css';

const ENVIRONMENTS: readonly { value: Site['environment']; label: string }[] = [
  { value: 'quiet-rural', label: 'Quiet country' },
  { value: 'rural', label: 'Country' },
  { value: 'residential', label: 'Houses' },
  { value: 'city', label: 'City' },
];
const ANTENNAS: readonly { value: Antenna['kind']; label: string }[] = [
  { value: 'whip', label: 'Whip' },
  { value: 'wire', label: 'Wire' },
  { value: 'ferrite', label: 'Ferrite rod' },
  { value: 'loop', label: 'Loop' },
  { value: 'dipole', label: 'Dipole' },
  { value: 'other', label: 'Other' },
];
const RECEIVER_NAME = 'My receiver';

type QuickForm = {
  place: QuickPlace | null;
  environment: Site['environment'];
  siteName: string;
  receiverName: string;
  antennaKind: Antenna['kind'];
};

const BLANK: QuickForm = {
  place: null,
  environment: 'rural',
  siteName: '',
  receiverName: RECEIVER_NAME,
  antennaKind: 'whip',
};

/** The fastest honest way to a first reception: where you are; the gear has names that can be changed later. */
export function QuickStartForm({ known }: { readonly known: StartChoice }) {
  const router = useIonRouter();
  const actions = useFieldActions();
  const act = useAct();
  const [form, setForm] = useState(BLANK);
  const change = (part: Partial<QuickForm>): void => setForm((before) => ({ ...before, ...part }));
  const setupId = known.setups.current?.id ?? null;
  const { place } = form;
  const shared = place ? sharedPlaceOf(place, form.environment) : null;
  const placeName = shared && 'locator' in shared ? `Site in ${shared.locator}` : 'First site';

  const start = async (): Promise<void> => {
    if (!place) return;
    const filled = {
      ...form,
      place,
      siteName: form.siteName.trim() || placeName,
      receiverName: form.receiverName.trim() || RECEIVER_NAME,
      antennaName: ANTENNAS.find(({ value }) => value === form.antennaKind)?.label ?? 'Antenna',
      setupId,
    };
    if (!(await act(() => actions.quickStart(filled, Date.now())))) return;
    void askToPersist();
    router.push(paths.frequency());
  };

  return (
    <div className="fd fd-quick">
      <h2 className="fd-head">Start listening</h2>
      <PlaceEntry place={place} onPlace={(found) => change({ place: found })} />
      {setupId === null ? <GearFields form={form} change={change} /> : null}
      <ChoiceChips
        label="Around you"
        options={ENVIRONMENTS}
        value={form.environment}
        onChange={(environment) => change({ environment: environment ?? 'rural' })}
      />
      <TextField
        label="Name of the place"
        value={form.siteName}
        onChange={(siteName) => change({ siteName })}
        placeholder={placeName}
        maxLength={60}
      />
      <p className="soft small">All of it can be changed later, under Antennas and Sites.</p>
      <Cautions />
      <ReadyLine />
      <InFoot>
        <div className="fd-start-foot">
          <p className="fd-see" role="status">
            {shared ? (
              <>
                Others will see this place as <b>{othersSee(shared)}</b>.
              </>
            ) : (
              'Say where you are: one tap, or four signs of a locator.'
            )}
          </p>
          <Button wide disabled={place === null} onClick={() => void start()}>
            {place ? 'Start the outing' : 'Where are you?'}
          </Button>
        </div>
      </InFoot>
    </div>
  );
}

function GearFields({ form, change }: { form: QuickForm; change: (part: Partial<QuickForm>) => void }) {
  return (
    <>
      <ChoiceChips
        label="Antenna"
        options={ANTENNAS}
        value={form.antennaKind}
        onChange={(kind) => change({ antennaKind: kind ?? 'whip' })}
      />
      <TextField
        label="Receiver"
        value={form.receiverName}
        onChange={(receiverName) => change({ receiverName })}
        maxLength={60}
      />
    </>
  );
}
