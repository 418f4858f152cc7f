import type { StoreTransaction } from './ports.js';

/**
 * What happens on the phone when the server says that a club is not, or no longer, this account's: the club
 * and its records leave the phone. Own records are to be copied to My log before that, in this transaction
 * and in this function; until that exists, what was not sent of such a club goes with it. My log itself is
 * never left: no membership of it can end.
 */
export async function leaveClub(tx: StoreTransaction, clubId: string): Promise<void> {
  const club = (await tx.clubs()).find((one) => one.clubId === clubId);
  if (!club || club.card.kind === 'my-log') return;
  await tx.removeClub(clubId);
}
