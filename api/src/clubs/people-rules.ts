import type { Role } from '@harkmoor/sync-model/records/member';
import { Refusal } from '../platform/errors/refusal.js';

/** Founding and inviting reach other people, so they ask for a confirmed address. */
export function confirmationRefusal(isConfirmed: boolean): Refusal | null {
  if (isConfirmed) return null;
  return new Refusal(
    'unconfirmed',
    'Confirm your mail address first: open the link in the mail we sent you.',
  );
}

/** A club without an admin could never get one again. `adminCount` counts current admins, under the club's lock. */
export function lastAdminRefusal(from: Role, to: Role, adminCount: number): Refusal | null {
  if (from !== 'admin' || to === 'admin' || adminCount > 1) return null;
  return new Refusal('last-admin', 'This is the last admin of the club. Make somebody else admin first.');
}

/** One sentence for codes that were never made, are used up, or too old. */
export function unknownCode(): Refusal {
  return new Refusal('code-unknown', 'This code does not open a club. Ask for a new one.');
}
