import { defaultShareCharacters } from '@harkmoor/sync-model/radio/path/shared-path';
import { useEffect, useState } from 'react';
import { useFormErrors } from '../../../design/form/use-form-errors';
import { registerUnsavedWork } from '../../../platform/unsaved-work';
import type { SiteForm as Values, SiteView } from '../data/site-record';

/** The values of a site's form. What others see follows surroundings and fix until the owner chooses it. */
export function useSiteForm(view: SiteView | null) {
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
      const follows = !isShareChosen && change.shared === undefined;
      return follows ? { ...next, shared: offeredShare(next) } : next;
    });
  };
  const chooseShared = (shared: Values['shared']): void => {
    setShareChosen(true);
    set({ shared });
  };
  return { errors, values, set, chooseShared };
}

function offeredShare({ home, environment, fix }: Pick<Values, 'home' | 'environment' | 'fix'>): 4 | 6 {
  return defaultShareCharacters({ home, environment, accuracyM: fix?.accuracyM });
}

function startValues(view: SiteView | null): Values {
  if (!view) {
    const fresh = { environment: 'rural', home: false } as const;
    return {
      ...fresh,
      name: '',
      fix: null,
      shared: offeredShare({ ...fresh, fix: null }),
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
