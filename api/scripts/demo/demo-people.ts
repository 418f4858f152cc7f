import type { Role } from '@harkmoor/sync-model/records/member';

/** The nine of the Marram Radio Circle. Nobody of these names is meant; the addresses can never be reached. */
export type DemoPerson = {
  readonly key: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly deviceId: string;
  readonly receiver: number;
  readonly antennas: readonly number[];
  readonly outings: number;
  /** True time minus the device clock. */
  readonly clockOffsetMs: number;
  /** Leaves scores out, gives O above the others, logs off schedule. */
  readonly isSloppy?: true;
};

export const DEMO_CLUB_NAME = 'Marram Radio Circle';
export const DEMO_PASSWORD = 'marram-demo-2026';

export const DEMO_PEOPLE: readonly DemoPerson[] = [
  person('marthe', 'Marthe Rødklit', 'admin', { receiver: 0, antennas: [0, 1, 2], outings: 15 }),
  person('toke', 'Toke Vandelhøj', 'organizer', { receiver: 1, antennas: [1, 3], outings: 14 }),
  person('asta', 'Asta Lyngmose', 'member', { receiver: 2, antennas: [1, 4, 5], outings: 15 }),
  person('birger', 'Birger Tangholm', 'member', {
    receiver: 3,
    antennas: [2, 6],
    outings: 13,
    clockOffsetMs: 400_000,
  }),
  person('silje', 'Silje Nørhede', 'member', { receiver: 0, antennas: [0, 2], outings: 13 }),
  person('knud', 'Knud Ravnsgård', 'member', { receiver: 4, antennas: [0, 7], outings: 12, isSloppy: true }),
  person('vibeke', 'Vibeke Strandhede', 'member', { receiver: 1, antennas: [1, 2], outings: 13 }),
  person('jeppe', 'Jeppe Holmsande', 'member', { receiver: 2, antennas: [1, 5], outings: 12 }),
  person('runa', 'Runa Klitgaarden', 'organizer', { receiver: 3, antennas: [3, 4], outings: 12 }),
];

function person(
  key: string,
  name: string,
  role: Role,
  rest: Omit<DemoPerson, 'key' | 'name' | 'role' | 'email' | 'deviceId' | 'clockOffsetMs'> & {
    clockOffsetMs?: number;
  },
): DemoPerson {
  const deviceId = `d${key}xxxxxxx`.slice(0, 8);
  return { key, name, role, email: `${key}@marram.invalid`, deviceId, clockOffsetMs: 0, ...rest };
}
