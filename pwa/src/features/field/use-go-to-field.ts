import { useCallback } from 'react';
import { useIonRouter } from '@ionic/react';
import { paths } from '../../platform/paths';

/** Leaves a page of an entry for Field, wherever the page was opened from; the entry's address does not stay behind it. */
export function useGoToField(): () => void {
  const router = useIonRouter();
  return useCallback(() => {
    router.push(paths.field(), 'back', 'pop');
  }, [router]);
}
