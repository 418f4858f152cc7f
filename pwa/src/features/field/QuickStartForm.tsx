import { useState } from 'react';
import { useIonRouter } from '@ionic/react';
import type { Antenna } from '@harkmoor/sync-model/records/antenna';
import type { Site } from '@harkmoor/sync-model/records/site';
import { Button } from '../../design/button/Button';
import { ChoiceChips } from '../../design/choice/ChoiceChips';
import { TextField } from '../../design/form/TextField';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';
import { askToPersist } from '../../platform/storage-persistence';
import { sharedPlaceOf, type QuickPlace } from './data/quick-start';
import { useFieldActions } from './data/use-field-actions';
import { Cautions } from './ui/Cautions';
import { PlaceEntry } from './ui/PlaceEntry';
import { ReadyLine } from './ui/ReadyLine';
import { useAct } from './use-act';
import type { StartChoice } from './use-start-choice';
import { othersSee } from './words';
import './ui/field.css';

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

/** The fastest honest way to a first reception: where you are; the gear has names that can be changed later. */
export function QuickStartForm({ known }: { readonly known: StartChoice }) {
  const router = useIonRouter();
  const actions = useFieldActions();
  const act = useAct();
  const [place, setPlace] = useState<QuickPlace | null>(null);
  const [environment, setEnvironment] = useState<Site['environment']>('rural');
  const [siteName, setSiteName] = useState('');
  const [receiverName, setReceiverName] = useState('My receiver');
  const [antennaKind, setAntennaKind] = useState<Antenna['kind']>('whip');
  const needsGear = known.setups.offered.length === 0;
  const shared = place ? sharedPlaceOf(place, environment) : null;
  const defaultName = shared && 'locator' in shared ? `Site in ${shared.locator}` : 'First site';
  const antennaName = ANTENNAS.find(({ value }) => value === antennaKind)?.label ?? 'Antenna';

  const start = async (): Promise<void> => {
    if (!place) return;
    const form = {
      place,
      environment,
      siteName: siteName.trim() || defaultName,
      receiverName: receiverName.trim() || 'My receiver',
      antennaName,
      antennaKind,
      setupId: known.setups.current?.id ?? null,
    };
    const isStarted = await act(() => actions.quickStart(form, Date.now()));
    if (!isStarted) return;
    void askToPersist();
    router.push(paths.frequency());
  };

  return (
    <PageFrame
      title="Start listening"
      foot={
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
      }
    >
      <div className="fd fd-quick">
        <PlaceEntry place={place} onPlace={setPlace} />
        {needsGear ? (
          <>
            <ChoiceChips
              label="Antenna"
              options={ANTENNAS}
              value={antennaKind}
              onChange={(kind) => setAntennaKind(kind ?? 'whip')}
            />
            <TextField label="Receiver" value={receiverName} onChange={setReceiverName} maxLength={60} />
          </>
        ) : null}
        <ChoiceChips
          label="Around you"
          options={ENVIRONMENTS}
          value={environment}
          onChange={(value) => setEnvironment(value ?? 'rural')}
        />
        <TextField
          label="Name of the place"
          value={siteName}
          onChange={setSiteName}
          placeholder={defaultName}
          maxLength={60}
        />
        <p className="soft small">All of it can be changed later, under Antennas and Sites.</p>
        <Cautions />
        <ReadyLine />
      </div>
    </PageFrame>
  );
}
