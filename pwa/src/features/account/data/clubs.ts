import type { ClubCard } from '@harkmoor/sync-model/protocol/messages';
import type { Role } from '@harkmoor/sync-model/records/member';
import { useLiveQuery } from 'dexie-react-hooks';
import { apiRequest } from '../../../platform/api/api-request';
import { useActiveLog, type ActiveLogActions } from '../../../store/active-log';
import { newClubState, type KnownClub, type OpenLog } from '../../../store/open-log';

export type ClubAnswer = { clubId: string; role: Role; card: ClubCard };

/** The clubs of the open log as this phone knows them, offline too; My log last. */
export function useKnownClubs(): KnownClub[] {
  const log = useActiveLog();
  const clubs = useLiveQuery(() => log.database.clubs.toArray(), [log.database]) ?? [];
  return clubs
    .map(({ clubId, role, card }) => ({ clubId, role, card }))
    .sort((a, b) => a.card.kind.localeCompare(b.card.kind) || a.card.name.localeCompare(b.card.name));
}

export async function foundClub(
  form: { name: string; ituRegion: 1 | 2 | 3 },
  log: OpenLog,
  actions: ActiveLogActions,
) {
  return enterClub(log, actions, await askForClub('/api/clubs', form, log));
}

export async function joinClub(code: string, log: OpenLog, actions: ActiveLogActions) {
  return enterClub(log, actions, await askForClub('/api/clubs/join', { code }, log));
}

function askForClub(path: string, body: unknown, log: OpenLog) {
  return apiRequest<ClubAnswer>(path, { method: 'POST', body, accountId: log.account?.id });
}

/** The new club is shown at once; its records come with the next rounds. */
async function enterClub(
  log: OpenLog,
  actions: ActiveLogActions,
  answer: Awaited<ReturnType<typeof askForClub>>,
) {
  if (answer.kind !== 'ok') return answer;
  const known = await log.database.clubs.get(answer.body.clubId);
  if (!known) await log.database.clubs.put(newClubState(answer.body));
  await actions.showClub(answer.body.clubId);
  return answer;
}
