import type { ComponentType } from 'react';
import { matchPath } from 'react-router-dom';
import { PATTERNS } from '../platform/paths';
import { pageOnDemand, type PageOnDemand } from './page-on-demand';

type PageName = keyof typeof PATTERNS;
type LoadPage = () => Promise<ComponentType>;

/** One loader for each pattern: each feature arrives with its first screen, and none before Field is usable. */
const LOADERS: Readonly<Record<PageName, LoadPage>> = {
  field: () => import('../features/field/FieldPage').then((m) => m.FieldPage),
  pad: () => import('../features/field/PadPage').then((m) => m.PadPage),
  startOuting: () => import('../features/field/StartOutingPage').then((m) => m.StartOutingPage),
  frequency: () => import('../features/field/FrequencyPage').then((m) => m.FrequencyPage),
  sites: () => import('../features/field/sites/SitesPage').then((m) => m.SitesPage),
  site: () => import('../features/field/sites/SitePage').then((m) => m.SitePage),
  logbook: () => import('../features/logbook/LogbookPage').then((m) => m.LogbookPage),
  reception: () => import('../features/logbook/ReceptionPage').then((m) => m.ReceptionPage),
  coverage: () => import('../features/coverage/CoveragePage').then((m) => m.CoveragePage),
  square: () => import('../features/coverage/SquarePage').then((m) => m.SquarePage),
  coverageTable: () => import('../features/coverage/CoverageTablePage').then((m) => m.CoverageTablePage),
  antennas: () => import('../features/antennas/GearPage').then((m) => m.GearPage),
  receiver: () => import('../features/antennas/ReceiverPage').then((m) => m.ReceiverPage),
  antenna: () => import('../features/antennas/AntennaPage').then((m) => m.AntennaPage),
  setup: () => import('../features/antennas/SetupPage').then((m) => m.SetupPage),
  events: () => import('../features/events/EventsPage').then((m) => m.EventsPage),
  desk: () => import('../features/desk/DeskPage').then((m) => m.DeskPage),
  people: () => import('../features/desk/PeoplePage').then((m) => m.PeoplePage),
  targetLists: () => import('../features/desk/TargetListsPage').then((m) => m.TargetListsPage),
  targetList: () => import('../features/desk/TargetListPage').then((m) => m.TargetListPage),
  targetListImport: () => import('../features/desk/TargetImportPage').then((m) => m.TargetImportPage),
  account: () => import('../features/account/AccountPage').then((m) => m.AccountPage),
  signIn: () => import('../features/account/SignInPage').then((m) => m.SignInPage),
  signUp: () => import('../features/account/SignUpPage').then((m) => m.SignUpPage),
  resetPassword: () => import('../features/account/ResetPage').then((m) => m.ResetPage),
  confirmAddress: () => import('../features/account/ConfirmPage').then((m) => m.ConfirmPage),
  clubs: () => import('../features/account/ClubsPage').then((m) => m.ClubsPage),
  sync: () => import('../features/sync-status/SyncPage').then((m) => m.SyncPage),
  settings: () => import('./settings/SettingsPage').then((m) => m.SettingsPage),
};

export type RoutedPage = { readonly name: PageName; readonly pattern: string; readonly Page: PageOnDemand };

/** The pages with their patterns, each loaded when first opened. */
export const ROUTED_PAGES: readonly RoutedPage[] = (Object.keys(PATTERNS) as PageName[]).map((name) => ({
  name,
  pattern: PATTERNS[name],
  Page: pageOnDemand(LOADERS[name]),
}));

/** What the thumb reaches next from Field, fetched while nothing else is done. */
const NEXT: readonly PageName[] = ['pad', 'frequency', 'startOuting', 'logbook'];

/** Fetches the page of an address before React asks for it: the first screen waits for one thing less. */
export function preloadPage(pathname: string): void {
  const page = ROUTED_PAGES.find(({ pattern }) =>
    matchPath(pattern, pathname === '/' ? PATTERNS.field : pathname),
  );
  page?.Page.preload().catch(() => undefined); // the boundary tells it when the page is drawn
}

/** Fetches the screens that follow Field; called when idle. */
export function preloadNext(): void {
  for (const { name, Page } of ROUTED_PAGES) {
    if (NEXT.includes(name)) Page.preload().catch(() => undefined); // told when it is opened
  }
}
