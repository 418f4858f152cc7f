import { createContext, use, type ComponentType, type ReactNode } from 'react';

/**
 * Places in the shared frame that belong to a feature. The app fills them, so that no feature imports another and
 * the frame imports none.
 */
export type Slots = {
  /** The state of sending, as a small mark and a line; links to the sync page. */
  readonly SyncLamp: ComponentType;
  /** The round badge with initials; links to the account page. */
  readonly AccountBadge: ComponentType;
  /** The name of the club whose log is open. */
  readonly ClubName: ComponentType;
};

const Nothing = (): ReactNode => null;
const SlotContext = createContext<Slots>({ SyncLamp: Nothing, AccountBadge: Nothing, ClubName: Nothing });

export const SlotProvider = SlotContext.Provider;

/** The components that stand in the frame's places. */
export function useSlots(): Slots {
  return use(SlotContext);
}
