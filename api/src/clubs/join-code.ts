import { randomInt } from 'node:crypto';
import { z } from 'zod';

/** Crockford's base 32: no I, L, O, U, so that a code can be read out and copied by hand. */
const ALPHABET = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';
const LENGTH = 10;

/** 50 random bits. */
export function newJoinCode(): string {
  return Array.from({ length: LENGTH }, () => ALPHABET[randomInt(ALPHABET.length)]).join('');
}

/** As people type it: either case, with blanks or hyphens, and with letters that look like figures. */
export const joinCodeSchema = z
  .string()
  .max(30)
  .transform((text) => text.toUpperCase().replace(/[\s-]/g, '').replace(/O/g, '0').replace(/[IL]/g, '1'))
  .pipe(
    z.string().regex(new RegExp(`^[${ALPHABET}]{${LENGTH}}$`), 'must be a code of 10 letters and figures'),
  );
