import { createHash, createHmac, hkdfSync, randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { Configuration } from '../configuration/configuration.js';

export type SecretPurpose = 'access-token' | 'refresh-successor' | 'mail-token' | 'join-code' | 'attempt-key';

/** One key for each purpose, derived from the one configured secret (HKDF, RFC 5869). */
@Injectable()
export class Secrets {
  private readonly keys = new Map<SecretPurpose, Buffer>();

  constructor(private readonly configuration: Configuration) {}

  key(purpose: SecretPurpose): Buffer {
    let key = this.keys.get(purpose);
    if (!key) {
      key = Buffer.from(hkdfSync('sha256', this.configuration.secret, '', `harkmoor:${purpose}`, 32));
      this.keys.set(purpose, key);
    }
    return key;
  }

  /** A keyed digest as base64url, 43 characters: the same text always gives the same. */
  mac(purpose: SecretPurpose, text: string): string {
    return createHmac('sha256', this.key(purpose)).update(text).digest('base64url');
  }
}

/** 256 random bits as base64url. */
export function randomToken(): string {
  return randomBytes(32).toString('base64url');
}

/** For tokens of 256 bits, where a plain hash is enough. */
export function tokenHash(token: string): string {
  return createHash('sha256').update(token).digest('base64url');
}
