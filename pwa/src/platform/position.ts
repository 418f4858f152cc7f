/** One reading of the device's position: WGS84 degrees, metres at 95 % as the browser states it, ms UTC. */
export type PositionFix = {
  readonly latitudeDeg: number;
  readonly longitudeDeg: number;
  readonly accuracyM: number;
  readonly altitudeM: number | null;
  readonly atMs: number;
};

export type PositionRefusal = {
  readonly code: 'denied' | 'unavailable' | 'timeout' | 'unsupported';
  /** What to do instead. */
  readonly message: string;
};

export type PositionAnswer =
  | { readonly ok: true; readonly fix: PositionFix }
  | { readonly ok: false; readonly refusal: PositionRefusal };

const REFUSALS: Readonly<Record<PositionRefusal['code'], string>> = {
  denied:
    'The browser may not read the position. Allow it in the browser’s settings, or set the point on the map.',
  unavailable: 'The device finds no position here. Set the point on the map, or type a locator.',
  timeout: 'No position within the time. Wait with a free view of the sky, or set the point on the map.',
  unsupported: 'This browser reads no position. Set the point on the map, or type a locator.',
};

/** One fresh position. Never rejects: a refusal is a value. The device is asked once and no watch stays. */
export async function readPosition(timeoutMs = 30_000): Promise<PositionAnswer> {
  if (!('geolocation' in navigator)) return refused('unsupported');
  return new Promise((resolve) => {
    navigator.geolocation.getCurrentPosition(
      (position) => resolve({ ok: true, fix: fixOf(position) }),
      (error) => resolve(refused(refusalCode(error))),
      { enableHighAccuracy: true, timeout: timeoutMs, maximumAge: 0 },
    );
  });
}

type AverageOptions = {
  readonly durationMs: number;
  /** Called with each reading, for the screen's progress. */
  readonly onReading?: (fix: PositionFix, count: number) => void;
  readonly signal?: AbortSignal;
};

/**
 * Watches the position for `durationMs` and answers with the mean of the readings, each weighted by the inverse
 * square of its stated accuracy. The stated accuracy of the answer is that of the best reading, not less: errors of
 * one place do not average away like noise. The watch ends with the answer.
 */
export async function averagePosition(options: AverageOptions): Promise<PositionAnswer> {
  if (!('geolocation' in navigator)) return refused('unsupported');
  const fixes: PositionFix[] = [];
  return new Promise((resolve) => {
    const finish = (refusal?: PositionRefusal['code']): void => {
      navigator.geolocation.clearWatch(watch);
      clearTimeout(timer);
      const mean = meanFix(fixes);
      resolve(mean ? { ok: true, fix: mean } : refused(refusal ?? 'timeout'));
    };
    const watch = navigator.geolocation.watchPosition(
      (position) => {
        fixes.push(fixOf(position));
        options.onReading?.(fixOf(position), fixes.length);
      },
      (error) => {
        if (error.code === error.PERMISSION_DENIED) finish('denied');
      },
      { enableHighAccuracy: true, timeout: options.durationMs, maximumAge: 0 },
    );
    const timer = setTimeout(() => finish(), options.durationMs);
    options.signal?.addEventListener('abort', () => finish('timeout'), { once: true });
  });
}

/** The weighted mean of fixes of one place; null of none. Longitudes are meant to lie on one side of 180°. */
export function meanFix(fixes: readonly PositionFix[]): PositionFix | null {
  const [first] = fixes;
  if (!first) return null;
  const reference = first.longitudeDeg;
  let [weights, latitude, east] = [0, 0, 0];
  for (const fix of fixes) {
    const weight = 1 / Math.max(1, fix.accuracyM) ** 2;
    weights += weight;
    latitude += weight * fix.latitudeDeg;
    east += weight * (((fix.longitudeDeg - reference + 540) % 360) - 180);
  }
  const best = fixes.reduce((a, b) => (b.accuracyM < a.accuracyM ? b : a));
  const longitude = reference + east / weights;
  return {
    latitudeDeg: latitude / weights,
    longitudeDeg: ((longitude + 540) % 360) - 180,
    accuracyM: best.accuracyM,
    altitudeM: best.altitudeM,
    atMs: Math.max(...fixes.map((fix) => fix.atMs)),
  };
}

function fixOf({ coords, timestamp }: GeolocationPosition): PositionFix {
  return {
    latitudeDeg: coords.latitude,
    longitudeDeg: coords.longitude,
    accuracyM: coords.accuracy,
    altitudeM: coords.altitude,
    atMs: Math.round(timestamp),
  };
}

function refusalCode(error: GeolocationPositionError): PositionRefusal['code'] {
  if (error.code === error.PERMISSION_DENIED) return 'denied';
  return error.code === error.TIMEOUT ? 'timeout' : 'unavailable';
}

function refused(code: PositionRefusal['code']): PositionAnswer {
  return { ok: false, refusal: { code, message: REFUSALS[code] } };
}
