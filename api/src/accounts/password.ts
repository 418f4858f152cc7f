import { Algorithm, hash, verify } from '@node-rs/argon2';

/** OWASP Password Storage Cheat Sheet, Argon2id: at least m = 19 456 KiB, t = 2, p = 1. */
const COST = { algorithm: 2 as Algorithm.Argon2id, memoryCost: 19_456, timeCost: 2, parallelism: 1 };
const COST_PREFIX = '$argon2id$v=19$m=19456,t=2,p=1$';

/** The hash of a password that nobody has: an unknown address costs the same work as a known one. */
const NOBODYS_HASH = await hashPassword('nobody has this password');

/** A PHC string; the password was checked and composed at the border. */
export function hashPassword(password: string): Promise<string> {
  return hash(password, COST);
}

/** Whether the password is the account's; without an account the same work is done and the answer is no. */
export async function passwordFits(passwordHash: string | undefined, password: string): Promise<boolean> {
  const fits = await verify(passwordHash ?? NOBODYS_HASH, password);
  return passwordHash !== undefined && fits;
}

/** True for hashes that were made at another cost; they are made anew at the next sign-in. */
export function needsRehash(passwordHash: string): boolean {
  return !passwordHash.startsWith(COST_PREFIX);
}
