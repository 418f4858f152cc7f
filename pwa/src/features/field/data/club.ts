import type { ItuRegion } from '@harkmoor/sync-model/radio/bands/region';
import { useActiveLog } from '../../../store/active-log';

/** The open club's region and kind: bands differ by region; nobody else sees My log. */
export function useClub(): { ituRegion: ItuRegion; isMyLog: boolean; isGuest: boolean } {
  const { card, account } = useActiveLog();
  return { ituRegion: card.ituRegion, isMyLog: card.kind === 'my-log', isGuest: account === null };
}
