/**
 * When and where a field was last written: 12 hex digits of milliseconds UTC, 4 of a counter, 8 characters of
 * device. Stamps sort as text. They order edits; they are never the time a signal was heard.
 */
export type Stamp = string;

export type StampParts = { readonly wallMs: number; readonly counter: number; readonly deviceId: string };

export const STAMP_PATTERN = /^[0-9a-f]{16}[0-9a-z]{8}$/;
export const DEVICE_ID_PATTERN = /^[0-9a-z]{8}$/;
/** The device part of stamps that the server itself makes. */
export const SERVER_DEVICE_ID = 'harkmoor';
/** A stamp further ahead of the server than this is refused as `clock-ahead`. */
export const STAMP_AHEAD_MS_MAX = 5 * 60_000;

const COUNTER_MAX = 0xffff;
const WALL_MS_MAX = 0xffff_ffff_ffff;

export function isStamp(text: unknown): text is Stamp {
  return typeof text === 'string' && STAMP_PATTERN.test(text);
}

export function formatStamp({ wallMs, counter, deviceId }: StampParts): Stamp {
  return `${hex(wallMs, 12)}${hex(counter, 4)}${deviceId}`;
}

/** Only for text that `isStamp` accepts. */
export function parseStamp(stamp: Stamp): StampParts {
  return {
    wallMs: Number.parseInt(stamp.slice(0, 12), 16),
    counter: Number.parseInt(stamp.slice(12, 16), 16),
    deviceId: stamp.slice(16),
  };
}

export function stampWallMs(stamp: Stamp): number {
  return Number.parseInt(stamp.slice(0, 12), 16);
}

/**
 * The stamp of a new edit: later than every stamp in `after`, and not before the wall clock. Hybrid logical
 * clock after Kulkarni et al. 2014, reduced to one writer.
 */
export function nextStamp(
  deviceId: string,
  wallMs: number,
  after: readonly (Stamp | null | undefined)[],
): Stamp {
  let best = { wallMs: clampWall(wallMs), counter: 0 };
  for (const stamp of after) {
    if (!stamp) continue;
    const seen = parseStamp(stamp);
    if (seen.wallMs > best.wallMs || (seen.wallMs === best.wallMs && seen.counter >= best.counter)) {
      best = counted(seen.wallMs, seen.counter);
    }
  }
  return formatStamp({ ...best, deviceId });
}

function counted(wallMs: number, counter: number): { wallMs: number; counter: number } {
  if (counter < COUNTER_MAX) return { wallMs, counter: counter + 1 };
  return { wallMs: wallMs + 1, counter: 0 };
}

/** A host whose clock cannot be read still gets stamps: the earliest ones. */
function clampWall(wallMs: number): number {
  if (Number.isNaN(wallMs)) return 0;
  return Math.min(WALL_MS_MAX, Math.max(0, Math.floor(wallMs)));
}

function hex(value: number, width: number): string {
  return value.toString(16).padStart(width, '0');
}
