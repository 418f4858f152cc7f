import type { Role } from '../src/records/member.js';
import type { HubClubState, MemoryHub } from './memory-hub.js';
import type { Random } from './random.js';

/** Ids in the form of UUIDv7, from a counter. */
export function idOf(number: number): string {
  return `01900000-0000-7000-8000-${number.toString(16).padStart(12, '0')}`;
}

export const ANNA = idOf(0xa1);
export const BO = idOf(0xb1);
export const CLUB = idOf(0xc1);
export const ANNAS_LOG = idOf(0xc2);
export const BOS_LOG = idOf(0xc3);

/** Two phones of one person and one of another, in one club, each person with a log of their own. */
export const PHONES = [
  { deviceId: 'phonea01', accountId: ANNA },
  { deviceId: 'phonea02', accountId: ANNA },
  { deviceId: 'phoneb01', accountId: BO },
] as const;

export function startClubs(): HubClubState[] {
  return [
    club(CLUB, 'club', [
      [ANNA, 'organizer'],
      [BO, 'organizer'],
    ]),
    club(ANNAS_LOG, 'my-log', [[ANNA, 'admin']]),
    club(BOS_LOG, 'my-log', [[BO, 'admin']]),
  ];
}

function club(clubId: string, kind: 'club' | 'my-log', members: [string, Role][]): HubClubState {
  return {
    clubId,
    card: { name: kind === 'club' ? 'Dune listeners' : 'My log', kind, ituRegion: 1, demo: false },
    historyId: 'first',
    seq: 0,
    members: new Map(members),
    records: new Map(),
    history: [],
  };
}

/** Bo leaves the club, comes back, or changes role; answers what happened. */
export function changeMembership(hub: MemoryHub, random: Random): string {
  const club = hub.clubs.get(CLUB)!;
  const members = new Map(club.members);
  const role = random.pick(['organizer', 'member', null] as const);
  if (role === null) members.delete(BO);
  else members.set(BO, role);
  hub.put({ ...club, members });
  return `Bo is ${role ?? 'no member'}`;
}
