import { useIonRouter } from '@ionic/react';
import { defaultShareCharacters, placeFromFix } from '@harkmoor/sync-model/radio/path/shared-path';
import { ENVIRONMENTS, siteSchema } from '@harkmoor/sync-model/records/site';
import { siteFixSchema } from '@harkmoor/sync-model/records/site-fix';
import { useEffect, useState, type FormEvent } from 'react';
import { Button } from '../../../design/button/Button';
import { ChoiceChips } from '../../../design/choice/ChoiceChips';
import { ErrorSummary } from '../../../design/form/ErrorSummary';
import { NumberField } from '../../../design/form/NumberField';
import { TextField } from '../../../design/form/TextField';
import { ToggleField } from '../../../design/form/ToggleField';
import { useFormErrors } from '../../../design/form/use-form-errors';
import { paths } from '../../../platform/paths';
import { schemaFaults, type SchemaFault } from '../../../platform/schema-faults';
import { registerUnsavedWork } from '../../../platform/unsaved-work';
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
import './sites.css';

const SURROUNDINGS = ENVIRONMENTS.map((value) => ({ value, label: ENVIRONMENT_WORDS[value] }));

/** Makes a site, or changes one's own. */
export function SiteForm({ view }: { readonly view: SiteView | null }) {
  const saveSite = useSaveSite();
  const router = useIonRouter();
  const errors = useFormErrors();
  const [values, setValues] = useState<Values>(() => startValues(view));
  const [isShareChosen, setShareChosen] = useState(view !== null);
  const [isDirty, setDirty] = useState(false);
  useEffect(() => (isDirty ? registerUnsavedWork() : undefined), [isDirty]);

  const set = (change: Partial<Values>): void => {
    setDirty(true);
    for (const field of Object.keys(change)) errors.mended(field);
    setValues((before) => {
      const next = { ...before, ...change };
      return isShareChosen || change.shared !== undefined
        ? next
        : { ...next, shared: defaultShareCharacters(next) };
    });
  };
  const leave = () => router.push(paths.sites(), 'back', 'pop');

  async function submit(event: FormEvent): Promise<void> {
    event.preventDefault();
    if (!errors.report(faultsOfSite(values)) || !values.fix) return;
    await saveSite(view?.site.id ?? null, { ...values, fix: values.fix });
    leave();
  }
  const text = (name: keyof Values & string) => errors.field(name);
  return (
    <form ref={errors.ref} noValidate onSubmit={(event) => void submit(event)}>
      <TextField
        {...text('name')}
        label="Name"
        required
        maxLength={60}
        value={values.name}
        onChange={(name) => set({ name })}
      />
      <FixEntry fix={values.fix} error={text('fix').error} onFix={(fix) => set({ fix })} />
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
        <SharedPlaceField
          fix={values.fix}
          shared={values.shared}
          onShared={(shared) => {
            setShareChosen(true);
            set({ shared });
          }}
        />
      ) : null}
      <ToggleField
        label="Others may start outings here"
        value={values.sharedUse}
        onChange={(sharedUse) => set({ sharedUse })}
      />
      <NumberField
        {...text('elevationM')}
        label="Elevation"
        unit="m"
        signed
        hint="Kept in your own log"
        value={values.elevationM}
        onChange={(elevationM) => set({ elevationM })}
      />
      <TextField
        {...text('notes')}
        label="Notes"
        hint="Others see them"
        lines={3}
        maxLength={4000}
        value={values.notes ?? ''}
        onChange={(notes) => set({ notes: notes === '' ? null : notes })}
      />
      <ErrorSummary form={errors} />
      <Button type="submit" wide>
        Save
      </Button>
      {view ? <PutAway view={view} leave={leave} /> : null}
    </form>
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

function startValues(view: SiteView | null): Values {
  if (!view) {
    const fresh = { environment: 'rural', home: false } as const;
    return {
      ...fresh,
      name: '',
      fix: null,
      shared: defaultShareCharacters(fresh),
      sharedUse: false,
      elevationM: null,
      notes: null,
    };
  }
  const { fields } = view.site;
  const shared = 'locator' in fields.place ? (fields.place.locator.length as 4 | 6 | 8) : 'exact';
  return {
    name: fields.name,
    environment: fields.environment,
    home: view.ownFix?.fields.home ?? false,
    fix: view.ownFix?.fields.fix ?? null,
    shared,
    sharedUse: fields.sharedUse,
    elevationM: view.ownFix?.fields.elevationM ?? null,
    notes: fields.notes,
  };
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
