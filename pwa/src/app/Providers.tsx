import type { ReactNode } from 'react';
import { SlotProvider } from '../design/slots/slots';
import { ActiveLogProvider } from '../store/active-log';
import { SyncProvider } from '../sync/sync-provider';
import { SLOTS } from './compose';

/** What every screen may ask for: the open log, its sending, and the frame's places. */
export function Providers({ children }: { readonly children: ReactNode }) {
  return (
    <ActiveLogProvider>
      <SyncProvider>
        <SlotProvider value={SLOTS}>{children}</SlotProvider>
      </SyncProvider>
    </ActiveLogProvider>
  );
}
