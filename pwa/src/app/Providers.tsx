import type { ReactNode } from 'react';
import { SlotProvider } from '../design/slots/slots';
import { SLOTS } from './compose';

/** What every screen may ask for. */
export function Providers({ children }: { readonly children: ReactNode }) {
  return <SlotProvider value={SLOTS}>{children}</SlotProvider>;
}
