import { lazy, type ComponentType } from 'react';
import { PATTERNS } from '../platform/paths';

type PageName = keyof typeof PATTERNS;
type LoadPage = () => Promise<{ default: ComponentType }>;

/** One loader for each pattern: each feature arrives with its first screen, and none before Field is usable. */
const LOADERS: Readonly<Record<PageName, LoadPage>> = {
  field: () => import('../features/field/FieldPage').then((m) => ({ default: m.FieldPage })),
  pad: () => import('../features/field/PadPage').then((m) => ({ default: m.PadPage })),
  startOuting: () =>
    import('../features/field/StartOutingPage').then((m) => ({ default: m.StartOutingPage })),
  frequency: () => import('../features/field/FrequencyPage').then((m) => ({ default: m.FrequencyPage })),
  sites: () => import('../features/field/sites/SitesPage').then((m) => ({ default: m.SitesPage })),
  site: () => import('../features/field/sites/SitePage').then((m) => ({ default: m.SitePage })),
  logbook: () => import('../features/logbook/LogbookPage').then((m) => ({ default: m.LogbookPage })),
  reception: () => import('../features/logbook/ReceptionPage').then((m) => ({ default: m.ReceptionPage })),
  coverage: () => import('../features/coverage/CoveragePage').then((m) => ({ default: m.CoveragePage })),
  square: () => import('../features/coverage/SquarePage').then((m) => ({ default: m.SquarePage })),
  coverageTable: () =>
    import('../features/coverage/CoverageTablePage').then((m) => ({ default: m.CoverageTablePage })),
  antennas: () => import('../features/antennas/GearPage').then((m) => ({ default: m.GearPage })),
  receiver: () => import('../features/antennas/ReceiverPage').then((m) => ({ default: m.ReceiverPage })),
  antenna: () => import('../features/antennas/AntennaPage').then((m) => ({ default: m.AntennaPage })),
  setup: () => import('../features/antennas/SetupPage').then((m) => ({ default: m.SetupPage })),
  events: () => import('../features/events/EventsPage').then((m) => ({ default: m.EventsPage })),
  desk: () => import('../features/desk/DeskPage').then((m) => ({ default: m.DeskPage })),
  people: () => import('../features/desk/PeoplePage').then((m) => ({ default: m.PeoplePage })),
  targetLists: () => import('../features/desk/TargetListsPage').then((m) => ({ default: m.TargetListsPage })),
  targetList: () => import('../features/desk/TargetListPage').then((m) => ({ default: m.TargetListPage })),
  targetListImport: () =>
    import('../features/desk/TargetImportPage').then((m) => ({ default: m.TargetImportPage })),
  clubSettings: () =>
    import('../features/desk/ClubSettingsPage').then((m) => ({ default: m.ClubSettingsPage })),
  account: () => import('../features/account/AccountPage').then((m) => ({ default: m.AccountPage })),
  signIn: () => import('../features/account/SignInPage').then((m) => ({ default: m.SignInPage })),
  signUp: () => import('../features/account/SignUpPage').then((m) => ({ default: m.SignUpPage })),
  resetPassword: () => import('../features/account/ResetPage').then((m) => ({ default: m.ResetPage })),
  confirmAddress: () => import('../features/account/ConfirmPage').then((m) => ({ default: m.ConfirmPage })),
  clubs: () => import('../features/account/ClubsPage').then((m) => ({ default: m.ClubsPage })),
  sync: () => import('../features/sync-status/SyncPage').then((m) => ({ default: m.SyncPage })),
  settings: () => import('./settings/SettingsPage').then((m) => ({ default: m.SettingsPage })),
};

export type RoutedPage = { readonly name: PageName; readonly pattern: string; readonly Page: ComponentType };

/** The pages with their patterns, each loaded when first opened. */
export const ROUTED_PAGES: readonly RoutedPage[] = (Object.keys(PATTERNS) as PageName[]).map((name) => ({
  name,
  pattern: PATTERNS[name],
  Page: lazy(LOADERS[name]),
}));
