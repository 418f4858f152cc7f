import type { Role } from '@harkmoor/sync-model/records/member';
import { useLiveQuery } from 'dexie-react-hooks';
import { apiRequest } from '../../../platform/api/api-request';
import { useActiveLog } from '../../../store/active-log';
import { readClubRecords } from '../../../store/club-records';
import type { OpenLog } from '../../../store/open-log';

export type PersonRow = {
  readonly accountId: string;
  readonly name: string;
  readonly role: Role;
  readonly joinedAt: number;
  readonly leftAt: number | null;
  readonly isMe: boolean;
};

export type People = { readonly log: OpenLog; readonly rows: readonly PersonRow[] };

/** The members of the shown club as this phone knows them, former members last. */
export function usePeople(): People | undefined {
  const log = useActiveLog();
  return useLiveQuery(async () => {
    const members = await readClubRecords(log, 'member');
    const rows = members
      .map(({ id, fields }) => ({
        accountId: id,
        name: fields.name,
        role: fields.role,
        joinedAt: fields.joinedAt,
        leftAt: fields.leftAt ?? null,
        isMe: id === log.account?.id,
      }))
      .sort((a, b) => Number(a.leftAt !== null) - Number(b.leftAt !== null) || a.name.localeCompare(b.name));
    return { log, rows };
  }, [log]);
}

/** A change of role is asked of the server and holds at the next request; the phone learns it with the next round. */
export function changeRole(log: OpenLog, accountId: string, role: Role) {
  return apiRequest<unknown>(`/api/clubs/${log.clubId}/members/${accountId}`, {
    method: 'PATCH',
    body: { role },
    accountId: log.account?.id,
  });
}

export type JoinCode = { code: string; expiresAt: number; usesLeft: number };

/** A new code replaces the one before; it is told this once. */
export function makeJoinCode(log: OpenLog) {
  return apiRequest<JoinCode>(`/api/clubs/${log.clubId}/join-code`, {
    method: 'POST',
    body: {},
    accountId: log.account?.id,
  });
}
