import type { ReactNode } from 'react';
import { useActiveLogState } from '../store/active-log';
import type { PATTERNS } from '../platform/paths';
import { pageOnDemand } from './page-on-demand';

type PageName = keyof typeof PATTERNS;

/** Pages that need no open log: the ways to get one, and what explains itself without. */
const WITHOUT_LOG: ReadonlySet<PageName> = new Set([
  'account',
  'signIn',
  'signUp',
  'resetPassword',
  'confirmAddress',
  'clubs',
  'sync',
  'settings',
]);

const WelcomePage = pageOnDemand(() => import('../features/account/WelcomePage').then((m) => m.WelcomePage));

/** Shows a page once a log is open; before the first one, the welcome in its place. */
export function LogGate({ page, children }: { readonly page: PageName; readonly children: ReactNode }) {
  const state = useActiveLogState();
  if (state.kind === 'open' || WITHOUT_LOG.has(page)) return children;
  return state.kind === 'opening' ? null : <WelcomePage />;
}
