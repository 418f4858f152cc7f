import type { Link, LinkAnswer } from '../src/device/ports.js';
import { asSyncAnswer } from '../src/protocol/light-check.js';
import type { SyncAnswer, SyncRequest } from '../src/protocol/messages.js';
import type { Random } from './random.js';
import type { Life, Scheduler } from './scheduler.js';

/** What may befall a round on its way. */
export type Fate =
  | 'good'
  | 'request-lost'
  | 'answer-lost'
  | 'answer-cut'
  | 'portal'
  | 'late'
  | 'twice'
  | 'unauthorized'
  | 'throttled'
  | 'server-error';

export type FateWeights = Readonly<Record<Fate, number>>;

type Answerer = (accountId: string, request: SyncRequest) => Promise<SyncAnswer | 'crashed'>;

export type Network = {
  linkOf(accountId: string, life: () => Life): Link;
  /** Delivers one request that its sender has long given up. */
  deliverLate(): boolean;
  readonly fates: Map<Fate, number>;
};

/** The way between phones and hub; every message is text on it, as on the wire. */
export function createNetwork(
  scheduler: Scheduler,
  random: Random,
  weights: () => FateWeights,
  answer: Answerer,
): Network {
  const late: { accountId: string; text: string }[] = [];
  const fates = new Map<Fate, number>();
  const ask = async (accountId: string, text: string): Promise<string | null> => {
    const body = await answer(accountId, JSON.parse(text) as SyncRequest);
    return body === 'crashed' ? null : JSON.stringify(body);
  };
  const exchange = async (accountId: string, life: Life, request: SyncRequest): Promise<LinkAnswer> => {
    const text = JSON.stringify(request);
    await scheduler.step(life, 'send');
    const fate = random.weighted(weights());
    fates.set(fate, (fates.get(fate) ?? 0) + 1);
    scheduler.note(fate);
    if (fate === 'unauthorized' || fate === 'server-error') return { kind: fate };
    if (fate === 'throttled') return { kind: 'throttled', retryAfterMs: 1000 };
    if (fate === 'portal') return received('<html><body>Sign in to the guest network</body></html>');
    if (fate === 'late') late.push({ accountId, text });
    if (fate === 'request-lost' || fate === 'late') return received(null);
    const second = fate === 'twice' ? ask(accountId, text) : null;
    const first = await ask(accountId, text);
    const told = second && random.chance(0.5) ? await second : first;
    await scheduler.step(life, 'receive');
    if (fate === 'answer-lost' || told === null) return received(null);
    return received(fate === 'answer-cut' ? told.slice(0, random.below(told.length)) : told);
  };
  return {
    fates,
    linkOf: (accountId, life) => ({ exchange: (request) => exchange(accountId, life(), request) }),
    deliverLate: () => {
      const message = late.length > 0 ? late.splice(random.below(late.length), 1)[0] : undefined;
      if (message) void ask(message.accountId, message.text);
      return message !== undefined;
    },
  };
}

/** As the browser's link does it: only a complete answer of ours is one. */
function received(text: string | null): LinkAnswer {
  if (text === null) return { kind: 'unreachable' };
  try {
    const body = asSyncAnswer(JSON.parse(text));
    return body ? { kind: 'answer', body } : { kind: 'unreachable' };
  } catch (error) {
    if (error instanceof SyntaxError) return { kind: 'unreachable' };
    throw error;
  }
}
