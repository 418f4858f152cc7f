import { useIonRouter } from '@ionic/react';
import { placeFromFix } from '@harkmoor/sync-model/radio/path/shared-path';
import { ENVIRONMENTS, siteSchema } from '@harkmoor/sync-model/records/site';
import { siteFixSchema } from '@harkmoor/sync-model/records/site-fix';
import type { FormEvent } from 'react';
import { Button } from '../../../design/button/Button';
import { ChoiceChips } from '../../../design/choice/ChoiceChips';
import { ErrorSummary } from '../../../design/form/ErrorSummary';
import { NumberField } from '../../../design/form/NumberField';
import { TextField } from '../../../design/form/TextField';
import { ToggleField } from '../../../design/form/ToggleField';
import { paths } from '../../../platform/paths';
import { schemaFaults, type SchemaFault } from '../../../platform/schema-faults';
import {
  putSiteAway,
  takeSiteBack,
  useSaveSite,
  type SiteForm as Values,
  type SiteView,
} from '../data/site-record';
import { FixEntry } from './FixEntry';
import { SharedPlaceField } from './SharedPlaceField';
import { ENVIRONMENT_WORDS } from './site-words';
import { useSiteForm } from './use-site-form';
import './sites.css';

const SURROUNDINGS = ENVIRONMENTS.map((value) => ({ value, label: ENVIRONMENT_WORDS[value] }));

type SiteFormProps = {
  readonly view: SiteView | null;
  /** Opened from the start of an outing, which takes the new site at once. */
  readonly isForOuting?: boolean;
};

/** Makes a site, or changes one's own. */
export function SiteForm({ view, isForOuting = false }: SiteFormProps) {
  const saveSite = useSaveSite();
  const router = useIonRouter();
  const form = useSiteForm(view);
  const { errors, values } = form;
  const leave = () => router.push(paths.sites(), 'back', 'pop');

  async function submit(event: FormEvent): Promise<void> {
    event.preventDefault();
    if (!errors.report(faultsOfSite(values)) || !values.fix) return;
    const id = await saveSite(view?.site.id ?? null, { ...values, fix: values.fix });
    if (isForOuting) router.push(paths.startOuting({ site: id }), 'back', 'pop');
    else leave();
  }
  return (
    <form ref={errors.ref} noValidate onSubmit={(event) => void submit(event)}>
      <SiteFields form={form} />
      <ErrorSummary form={errors} />
      <Button type="submit" wide>
        Save
      </Button>
      {view ? <PutAway view={view} leave={leave} /> : null}
    </form>
  );
}

function SiteFields({ form }: { readonly form: ReturnType<typeof useSiteForm> }) {
  const { errors, values, set } = form;
  return (
    <>
      <TextField
        {...errors.field('name')}
        label="Name"
        required
        maxLength={60}
        value={values.name}
        onChange={(name) => set({ name })}
      />
      <FixEntry fix={values.fix} error={errors.field('fix').error} onFix={(fix) => set({ fix })} />
      <ChoiceChips
        label="Noise surroundings"
        options={SURROUNDINGS}
        value={values.environment}
        onChange={(environment) => environment !== null && set({ environment })}
      />
      <ToggleField
        label="This is my home"
        hint="Shared as a large square unless you choose otherwise"
        value={values.home}
        onChange={(home) => set({ home })}
      />
      {values.fix ? (
        <SharedPlaceField fix={values.fix} shared={values.shared} onShared={form.chooseShared} />
      ) : null}
      <ToggleField
        label="Others may start outings here"
        value={values.sharedUse}
        onChange={(sharedUse) => set({ sharedUse })}
      />
      <NumberField
        {...errors.field('elevationM')}
        label="Elevation"
        unit="m"
        signed
        hint="Kept in your own log"
        value={values.elevationM}
        onChange={(elevationM) => set({ elevationM })}
      />
      <TextField
        {...errors.field('notes')}
        label="Notes"
        hint="Others see them"
        lines={3}
        maxLength={4000}
        value={values.notes ?? ''}
        onChange={(notes) => set({ notes: notes === '' ? null : notes })}
      />
    </>
  );
}

function PutAway({ view, leave }: { readonly view: SiteView; readonly leave: () => void }) {
  if (view.site.fields.retiredAt !== null) {
    return (
      <Button look="outline" onClick={() => void takeSiteBack(view).then(leave)}>
        Use it again
      </Button>
    );
  }
  return (
    <Button look="danger" onClick={() => void putSiteAway(view, Date.now()).then(leave)}>
      {view.isUsed ? 'Retire this site: its evidence stays' : 'Move to the bin'}
    </Button>
  );
}

/** By the records' own schemas, so that nothing is saved that the server would refuse. */
function faultsOfSite(values: Values): SchemaFault[] {
  const { name, environment, sharedUse, notes, fix, elevationM, home } = values;
  const point = fix
    ? []
    : [{ field: 'fix', message: 'Set the point: by position, on the map, or by a locator' }];
  const site = { name: name.trim().normalize('NFC'), environment, sharedUse, notes };
  const siteFields = siteSchema.pick({ name: true, environment: true, sharedUse: true, notes: true });
  const place = fix
    ? schemaFaults(siteSchema.pick({ place: true }), { place: placeFromFix(fix, values.shared) })
    : [];
  const own = fix
    ? schemaFaults(siteFixSchema.pick({ fix: true, elevationM: true, home: true }), { fix, elevationM, home })
    : [];
  return [...schemaFaults(siteFields, site), ...point, ...place, ...own];
}
