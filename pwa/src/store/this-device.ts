/**
 * What this browser knows before any database is open: its own short id, and whose log it shows. Kept in
 * localStorage because the first frame needs it; nothing here is secret.
 */
const DEVICE_ID_KEY = 'harkmoor.device-id';
const OPEN_LOG_KEY = 'harkmoor.open-log';
const ALPHABET = '0123456789abcdefghjkmnpqrstvwxyz';

/** Eight characters, made once for this browser; the device part of every stamp it makes. */
export function thisDeviceId(): string {
  const known = localStorage.getItem(DEVICE_ID_KEY);
  if (known) return known;
  const bytes = crypto.getRandomValues(new Uint8Array(8));
  const made = Array.from(bytes, (byte) => ALPHABET[byte % 32]).join('');
  localStorage.setItem(DEVICE_ID_KEY, made);
  return made;
}

/** An account's id, 'guest', or null where no log was opened on this phone yet. */
export function openLogName(): string | null {
  return localStorage.getItem(OPEN_LOG_KEY);
}

export function rememberOpenLog(name: string | null): void {
  if (name === null) localStorage.removeItem(OPEN_LOG_KEY);
  else localStorage.setItem(OPEN_LOG_KEY, name);
}
