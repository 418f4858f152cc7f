import { createContext, use, useCallback, useEffect, useMemo, useState, type ReactNode } from 'react';
import { NoticeLine } from './NoticeLine';

type Notice = { readonly text: string; readonly actionLabel?: string; readonly onAction?: () => void };
/** Says one line over the tabs, whichever screen follows: "Site saved". A new line replaces the last. */
export type Say = (text: string, action?: { readonly label: string; readonly run: () => void }) => void;

const SHOWN_MS = 7000;
const SayContext = createContext<Say>(() => undefined);

/** Holds the one line that outlives a change of screen. `children` get to say it by `useSay`. */
export function NoticeProvider({ children }: { readonly children: ReactNode }) {
  const [notice, setNotice] = useState<Notice | null>(null);
  const say = useCallback<Say>((text, action) => {
    const run = action?.run;
    setNotice({
      text,
      actionLabel: action?.label,
      onAction: run && (() => [run(), setNotice(null)]),
    });
  }, []);
  useEffect(() => {
    if (notice === null) return;
    const timer = setTimeout(() => setNotice(null), SHOWN_MS);
    return () => clearTimeout(timer);
  }, [notice]);
  const line = useMemo(() => notice ?? { text: null }, [notice]);
  return (
    <SayContext value={say}>
      {children}
      <div className="hm-notice-float">
        <NoticeLine {...line} />
      </div>
    </SayContext>
  );
}

export function useSay(): Say {
  return use(SayContext);
}
