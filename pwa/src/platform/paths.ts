/**
 * Every address of the application, and the functions that build them. Screens link only through these, so that a
 * renamed address is a type error and not a dead link.
 */
export const paths = {
  field: () => '/field',
  pad: (query: PadQuery = {}) => withQuery('/field/pad', query),
  startOuting: (query: Query = {}) => withQuery('/field/start', query),
  frequency: () => '/field/frequency',
  sites: () => '/field/sites',
  site: (id: string) => `/field/sites/${encodeURIComponent(id)}`,
  newSite: (query: Query = {}) => withQuery('/field/sites/new', query),
  logbook: (query: Query = {}) => withQuery('/logbook', query),
  reception: (id: string) => `/logbook/${encodeURIComponent(id)}`,
  coverage: (query: Query = {}) => withQuery('/coverage', query),
  square: (locator: string, query: Query = {}) =>
    withQuery(`/coverage/square/${encodeURIComponent(locator)}`, query),
  coverageTable: (query: Query = {}) => withQuery('/coverage/table', query),
  antennas: () => '/antennas',
  receiver: (id: string) => `/antennas/receivers/${encodeURIComponent(id)}`,
  newReceiver: () => '/antennas/receivers/new',
  antenna: (id: string) => `/antennas/antennas/${encodeURIComponent(id)}`,
  newAntenna: () => '/antennas/antennas/new',
  setup: (id: string) => `/antennas/setups/${encodeURIComponent(id)}`,
  newSetup: () => '/antennas/setups/new',
  events: () => '/events',
  desk: () => '/desk',
  people: () => '/desk/people',
  targetLists: () => '/desk/target-lists',
  targetList: (id: string) => `/desk/target-lists/${encodeURIComponent(id)}`,
  targetListImport: (id: string) => `/desk/target-lists/${encodeURIComponent(id)}/import`,
  account: () => '/account',
  signIn: (query: Query = {}) => withQuery('/account/sign-in', query),
  signUp: (query: Query = {}) => withQuery('/account/sign-up', query),
  resetPassword: (query: Query = {}) => withQuery('/account/reset', query),
  confirmAddress: (query: Query = {}) => withQuery('/account/confirm', query),
  clubs: (query: Query = {}) => withQuery('/account/clubs', query),
  sync: () => '/sync',
  settings: () => '/settings',
} as const;

/**
 * The patterns that the router matches. `new` is an ordinary value of `:id`: a form page reads it with `isNewId`.
 */
export const PATTERNS = {
  field: '/field',
  pad: '/field/pad',
  startOuting: '/field/start',
  frequency: '/field/frequency',
  sites: '/field/sites',
  site: '/field/sites/:id',
  logbook: '/logbook',
  reception: '/logbook/:id',
  coverage: '/coverage',
  square: '/coverage/square/:locator',
  coverageTable: '/coverage/table',
  antennas: '/antennas',
  receiver: '/antennas/receivers/:id',
  antenna: '/antennas/antennas/:id',
  setup: '/antennas/setups/:id',
  events: '/events',
  desk: '/desk',
  people: '/desk/people',
  targetLists: '/desk/target-lists',
  targetList: '/desk/target-lists/:id',
  targetListImport: '/desk/target-lists/:id/import',
  account: '/account',
  signIn: '/account/sign-in',
  signUp: '/account/sign-up',
  resetPassword: '/account/reset',
  confirmAddress: '/account/confirm',
  clubs: '/account/clubs',
  sync: '/sync',
  settings: '/settings',
} as const;

/** What stands behind the question mark of an address; empty values are left out. */
export type Query = Readonly<Record<string, string | number | null | undefined>>;

/** What the score pad is opened for: a target of the round, an edited reception, or a frequency that was typed. */
export type PadQuery = {
  readonly targetId?: string;
  readonly receptionId?: string;
  readonly frequencyHz?: number;
  /** The moment of the tap, ms UTC. */
  readonly atMs?: number;
  /** How it came to be listened for. */
  readonly means?: 'round' | 'planned' | 'chance';
  readonly roundNo?: number;
  readonly mode?: string;
  /** The reception whose scores stand as outlines: *Same again*. */
  readonly again?: string;
  /** The id that the new reception, and its draft, will have. */
  readonly draft?: string;
};

/** The sections of the application, in the order of the tabs. */
export const SECTIONS = [
  { name: 'field', label: 'Field', path: '/field' },
  { name: 'logbook', label: 'Logbook', path: '/logbook' },
  { name: 'coverage', label: 'Coverage', path: '/coverage' },
  { name: 'antennas', label: 'Antennas', path: '/antennas' },
  { name: 'events', label: 'Events', path: '/events' },
] as const;

export type SectionName = (typeof SECTIONS)[number]['name'] | 'desk';

/** The section that an address belongs to, or null for account, sync and settings. */
export function sectionOf(pathname: string): SectionName | null {
  const first = pathname.split('/')[1];
  if (first === 'desk') return 'desk';
  return SECTIONS.find((section) => section.name === first)?.name ?? null;
}

/** True for the `:id` of a form that makes a new record. */
export function isNewId(id: string | undefined): boolean {
  return id === undefined || id === 'new';
}

function withQuery(path: string, query: Query): string {
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query)) {
    if (value !== null && value !== undefined && value !== '') search.set(name, String(value));
  }
  const text = search.toString();
  return text === '' ? path : `${path}?${text}`;
}
