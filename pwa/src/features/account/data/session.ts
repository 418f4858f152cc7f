import { dropAccessToken, keepAccessToken, type SignInBody } from '../../../platform/api/access-token';
import { apiRequest, type ApiAnswer } from '../../../platform/api/api-request';
import { takeOverGuestLog } from '../../../store/guest-takeover';
import type { ActiveLogActions } from '../../../store/active-log';
import type { KnownClub } from '../../../store/open-log';
import { thisDeviceId } from '../../../store/this-device';

export type SignInForm = { email: string; password: string };

/** What a sign-in brought: the account's log is open, and what was logged without an account stands in My log. */
export type SignedIn = { kind: 'ok'; body: { takenOver: number } };

/**
 * Signs in, opens the account's log on this phone and takes over the guest's. Anything but `ok` leaves the open
 * log as it was.
 */
export async function signIn(
  form: SignInForm,
  actions: ActiveLogActions,
): Promise<SignedIn | Exclude<ApiAnswer<never>, { kind: 'ok' }>> {
  const answer = await apiRequest<SignInBody>('/api/accounts/sign-in', {
    method: 'POST',
    body: { ...form, deviceId: thisDeviceId(), deviceName: deviceName() },
  });
  if (answer.kind !== 'ok') return answer;
  const { accessToken, account, clubs } = answer.body;
  keepAccessToken(account.id, accessToken);
  const log = await actions.openAccount({ account, clubs: clubs as KnownClub[] });
  return { kind: 'ok', body: { takenOver: await takeOverGuestLog(log) } };
}

/**
 * Ends the session here and at the server when it can be reached. The person's database stays sealed off on the
 * phone under their account: unsent entries are sent when they sign in again.
 */
export async function signOut(accountId: string, actions: ActiveLogActions): Promise<void> {
  await apiRequest('/api/accounts/sign-out', { method: 'POST', body: {}, accountId });
  dropAccessToken();
  actions.close();
}

/** In words a person knows their phone by; the browser tells no more. */
function deviceName(): string {
  const agent = navigator.userAgent;
  const system = /iPhone|iPad/.test(agent)
    ? 'iPhone or iPad'
    : /Android/.test(agent)
      ? 'Android phone'
      : /Mac OS/.test(agent)
        ? 'Mac'
        : /Windows/.test(agent)
          ? 'Windows computer'
          : 'Computer';
  const browser = /Firefox/.test(agent)
    ? 'Firefox'
    : /Edg\//.test(agent)
      ? 'Edge'
      : /Chrome/.test(agent)
        ? 'Chrome'
        : 'browser';
  return `${system}, ${browser}`;
}
