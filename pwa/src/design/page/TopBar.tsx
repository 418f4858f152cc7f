import { useSlots } from '../slots/slots';

/** Sync lamp at the left, the round badge at the right. From 1024 px both stand in the rail instead. */
export function TopBar() {
  const { SyncLamp, AccountBadge } = useSlots();
  return (
    <div className="hm-top-bar">
      <SyncLamp />
      <AccountBadge />
    </div>
  );
}
