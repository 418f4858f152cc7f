import type { Slots } from '../design/slots/slots';
import { AccountBadge } from '../features/account/AccountBadge';
import { ClubName } from '../features/account/ClubName';
import { SyncLamp } from '../features/sync-status/SyncLamp';

/** Gives the shared frame what belongs to features. The only place where features meet. */
export const SLOTS: Slots = { SyncLamp, AccountBadge, ClubName };
