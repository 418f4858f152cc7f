import type { FieldFault } from '../../design/form/use-form-errors';

const PASSWORD_LENGTH_MIN = 10;
const PASSWORD_LENGTH_MAX = 128;

/** Faults that need no server to see; the server checks again. */
export function addressFaults(email: string): FieldFault[] {
  return /^[^\s@]+@[^\s@]+\.[^\s@]+$/.test(email.trim())
    ? []
    : [{ field: 'email', message: 'Write a mail address, such as name@example.org' }];
}

export function passwordFaults(password: string): FieldFault[] {
  if (password.length < PASSWORD_LENGTH_MIN) {
    return [{ field: 'password', message: `Use at least ${PASSWORD_LENGTH_MIN} characters` }];
  }
  if (password.length > PASSWORD_LENGTH_MAX) {
    return [{ field: 'password', message: `Use at most ${PASSWORD_LENGTH_MAX} characters` }];
  }
  return [];
}

export function nameFaults(name: string): FieldFault[] {
  const length = name.trim().normalize('NFC').length;
  if (length === 0) return [{ field: 'name', message: 'Write a name' }];
  return length > 60 ? [{ field: 'name', message: 'Use at most 60 characters' }] : [];
}
