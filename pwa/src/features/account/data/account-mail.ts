import { apiRequest } from '../../../platform/api/api-request';

/** The answers are the same whether the address is known or not: the mail tells its owner alone. */
export function signUp(form: { name: string; email: string; password: string }) {
  return apiRequest<unknown>('/api/accounts/sign-up', { method: 'POST', body: form });
}

export function confirmAddress(token: string) {
  return apiRequest<unknown>('/api/accounts/confirm', { method: 'POST', body: { token } });
}

export function askForReset(email: string) {
  return apiRequest<unknown>('/api/accounts/reset-request', { method: 'POST', body: { email } });
}

export function resetPassword(form: { token: string; password: string }) {
  return apiRequest<unknown>('/api/accounts/reset', { method: 'POST', body: form });
}
