import { APP } from './addresses';
import type { Person } from './people';

/** What a person does at another device of theirs, through the API: kept to what a journey only needs to stand ready. */
export async function signedInElsewhere(person: Person): Promise<ServerSession> {
  const { email, password } = person;
  const body = await ask<{ accessToken: string; clubs: ServerSession['clubs'] }>('/api/accounts/sign-in', {
    body: { email, password, deviceId: 'e2edesk0', deviceName: 'Desk' },
  });
  return {
    clubs: body.clubs,
    ask: (path, sent) => ask(path, { body: sent, token: body.accessToken }),
  };
}

export type ServerSession = {
  readonly clubs: readonly { readonly clubId: string; readonly card: { readonly name: string } }[];
  ask<T>(path: string, sent: unknown): Promise<T>;
};

export async function joinCode(session: ServerSession, clubName: string): Promise<string> {
  const club = session.clubs.find(({ card }) => card.name === clubName);
  if (!club) throw new Error(`the person is in no club "${clubName}"`);
  return (await session.ask<{ code: string }>(`/api/clubs/${club.clubId}/join-code`, {})).code;
}

async function ask<T>(path: string, { body, token }: { body: unknown; token?: string }): Promise<T> {
  const answer = await fetch(`${APP}${path}`, {
    method: 'POST',
    headers: {
      'content-type': 'application/json',
      origin: APP,
      ...(token ? { authorization: `Bearer ${token}` } : {}),
    },
    body: JSON.stringify(body),
  });
  if (!answer.ok) throw new Error(`${path} was answered ${answer.status}: ${await answer.text()}`);
  return (await answer.json()) as T;
}
