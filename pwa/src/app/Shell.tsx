import type { ReactNode } from 'react';
import { useLocation } from 'react-router-dom';
import { PATTERNS } from '../platform/paths';
import { PhoneTabs } from './PhoneTabs';
import { SideRail } from './SideRail';
import { UpdateLine } from './updates/UpdateLine';

/** Screens that need the whole height of a phone: the thumb's keys stand where the tabs would. */
const WITHOUT_TABS: ReadonlySet<string> = new Set([PATTERNS.pad, PATTERNS.frequency]);

/** The rail of a laptop beside the pages, and what lies over them. */
export function Shell({ children }: { readonly children: ReactNode }) {
  const { pathname } = useLocation();
  return (
    <div className={WITHOUT_TABS.has(pathname) ? 'shell shell-without-tabs' : 'shell'}>
      <SideRail />
      <div className="shell-main">
        <div className="shell-pages">{children}</div>
        <UpdateLine />
        <PhoneTabs />
      </div>
    </div>
  );
}
