import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lampOf, type LampInput } from './lamp-words';

const NOW = Date.UTC(2026, 10, 12, 18, 42);
const account = (over: Partial<Extract<LampInput, { kind: 'account' }>>): LampInput => ({
  kind: 'account',
  waiting: 0,
  refused: 0,
  pause: null,
  isRunning: false,
  lastContactAt: null,
  completeAt: null,
  ...over,
});

describe('the sync lamp', () => {
  it('should say how many are only here and when the server was last reached', () => {
    const lamp = lampOf(account({ waiting: 7, lastContactAt: Date.UTC(2026, 10, 12, 14, 5) }), NOW);
    expect(lamp).toEqual({ look: 'waiting', text: '7 only here · last contact 14:05' });
  });

  it('should ask for a sign-in where the session has ended', () => {
    expect(lampOf(account({ waiting: 12, pause: 'signed-out' }), NOW).text).toBe('Sign in to send 12');
  });

  it('should never say sent while anything waits or no round was complete', () => {
    fc.assert(
      fc.property(
        fc.nat(50),
        fc.nat(3),
        fc.constantFrom(null, 'unreachable', 'signed-out', 'throttled', 'failed' as const),
        fc.boolean(),
        fc.option(fc.constant(NOW - 60_000), { nil: null }),
        (waiting, refused, pause, isRunning, completeAt) => {
          const lamp = lampOf(account({ waiting, refused, pause, isRunning, completeAt } as never), NOW);
          if (lamp.look === 'sent' || lamp.text.startsWith('Sent')) {
            expect([waiting, refused, completeAt === null, pause === 'signed-out']).toEqual([
              0,
              0,
              false,
              false,
            ]);
          }
          expect(lamp.text).not.toMatch(/verified/i);
        },
      ),
    );
  });
});
