import type { Mode } from '@harkmoor/sync-model/records/common-fields';
import type { PadAddress } from './data/pad-start';

const MODES: readonly Mode[] = ['AM', 'SAM', 'USB', 'LSB', 'DSB', 'CW', 'FM', 'digital', 'other'];
const MEANS = ['round', 'planned', 'chance'] as const;

/** Reads the address of a pad; what it does not understand is null, never a guess. */
export function padAddress(search: string): PadAddress {
  const query = new URLSearchParams(search);
  const whole = (name: string): number | null => {
    const text = query.get(name);
    return text !== null && /^\d{1,15}$/.test(text) ? Number(text) : null;
  };
  return {
    receptionId: query.get('receptionId'),
    draftId: query.get('draft'),
    targetId: query.get('targetId'),
    frequencyHz: whole('frequencyHz'),
    mode: MODES.find((mode) => mode === query.get('mode')) ?? null,
    means: MEANS.find((means) => means === query.get('means')) ?? null,
    roundNo: whole('roundNo'),
    atMs: whole('atMs'),
    againId: query.get('again'),
    path: `/field/pad${search}`,
  };
}
