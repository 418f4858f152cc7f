import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { describe, expect, expectTypeOf, it } from 'vitest';
import { z } from 'zod';
import { canonicalJson } from '../merge/canonical-json.js';
import { syncAnswerSchema, syncRequestSchema } from './message-schemas.js';
import type { SyncAnswer, SyncRequest } from './messages.js';
import { PROTOCOL_VERSION } from './version.js';

const CLUB = '01890000-0000-7000-8000-000000000001';
const RECORD = '01890000-0000-7000-8000-000000000002';
const STAMP = '0190000000000000devicea1';

function request(changes: unknown[]): unknown {
  const clubs = [{ clubId: CLUB, historyId: null, cursor: 0, changes }];
  return { protocol: 1, deviceId: 'devicea1', sentAt: 1, clubs };
}

const change = { type: 'site', id: RECORD, at: STAMP, fields: { name: 'Moor' }, base: { name: STAMP } };

describe('the message schemas', () => {
  it('should say the same as the types of the messages', () => {
    expectTypeOf<z.infer<typeof syncRequestSchema>>().toEqualTypeOf<SyncRequest>();
    expectTypeOf<z.infer<typeof syncAnswerSchema>>().toEqualTypeOf<SyncAnswer>();
  });

  it('should not change without a new protocol version', () => {
    const text = canonicalJson([syncRequestSchema, syncAnswerSchema].map((schema) => z.toJSONSchema(schema)));
    const hash = createHash('sha256').update(text).digest('hex').slice(0, 16);
    const paper = readFileSync(new URL('../../docs/protocol.md', import.meta.url), 'utf8');
    const line = paper.split('\n').find((one) => one.startsWith(`| ${PROTOCOL_VERSION} |`));
    expect(
      line,
      `The messages changed (schema hash ${hash}). Raise PROTOCOL_VERSION in protocol/version.ts, keep serving ` +
        `the old one, and add a line "| ${PROTOCOL_VERSION + 1} | ${hash} | what changed |" to docs/protocol.md. ` +
        'Only a change that no phone has met yet may replace the hash of its line.',
    ).toContain(`| ${hash} |`);
  });

  it('should take a round of ordinary changes', () => {
    expect(syncRequestSchema.safeParse(request([change])).success).toBe(true);
  });

  it.each([
    ['an unknown key', request([{ ...change, extra: 1 }])],
    ['a server-written type', request([{ ...change, type: 'member' }])],
    ['a malformed stamp', request([{ ...change, at: 'now' }])],
    ['a malformed stamp of a field', request([{ ...change, stamps: { name: '' } }])],
    ['an id that is no UUIDv7', request([{ ...change, id: '1' }])],
    ['a field name without end', request([{ ...change, fields: { ['x'.repeat(41)]: 1 } }])],
    ['more than 1 000 changes', request(Array.from({ length: 1001 }, () => change))],
    [
      'a club named twice',
      {
        ...(request([]) as SyncRequest),
        clubs: [1, 2].map(() => ({ clubId: CLUB, historyId: null, cursor: 0 })),
      },
    ],
    ['no object', 'hello'],
  ])('should refuse %s', (_what, body) => {
    expect(syncRequestSchema.safeParse(body).success).toBe(false);
  });

  it('should count changes over all clubs', () => {
    const clubs = [1, 2].map((n) => ({
      clubId: CLUB.slice(0, -1) + n,
      historyId: null,
      cursor: 0,
      changes: Array.from({ length: 501 }, () => change),
    }));
    expect(syncRequestSchema.safeParse({ ...(request([]) as SyncRequest), clubs }).success).toBe(false);
  });
});
