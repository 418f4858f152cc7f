import type { ReactNode } from 'react';
import { NoticeProvider } from '../design/notice/notices';
import { SlotProvider } from '../design/slots/slots';
import { ActiveLogProvider } from '../store/active-log';
import { SyncProvider } from '../sync/sync-provider';
import { SLOTS } from './compose';

/** What every screen may ask for: the open log, its sending, the frame's places and the line over the tabs. */
export function Providers({ children }: { readonly children: ReactNode }) {
  return (
    <ActiveLogProvider>
      <SyncProvider>
        <SlotProvider value={SLOTS}>
          <NoticeProvider>{children}</NoticeProvider>
        </SlotProvider>
      </SyncProvider>
    </ActiveLogProvider>
  );
}
