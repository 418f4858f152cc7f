/** The two-sided 95 % point of the normal distribution. */
const Z = 1.959963984540054;

/** A 95 % interval of a share, both ends within 0..1. */
export type Interval = { readonly low: number; readonly high: number };

/**
 * The Wilson score interval (95 %) of `heard` out of `n`. Newcombe 1998, method 3, without continuity
 * correction. `heard` may be any real number from 0 to `n`: a mean of hourly rates times the number of dates is
 * no whole number, and the formula asks only for the share and the weight. It always holds `heard / n`.
 * Nothing tried (`n` = 0) says nothing: 0 to 1.
 */
export function wilsonInterval(heard: number, n: number): Interval {
  if (!(n >= 0) || !(heard >= 0) || heard > n * (1 + 1e-12)) {
    throw new Error(`a share needs 0 ≤ heard ≤ n, got ${heard} of ${n}`);
  }
  if (n === 0) return { low: 0, high: 1 };
  const share = Math.min(1, heard / n);
  const weight = n + Z * Z;
  const centre = (share * n + (Z * Z) / 2) / weight;
  const half = (Z / weight) * Math.sqrt(n * share * (1 - share) + (Z * Z) / 4);
  return {
    low: Math.max(0, Math.min(share, centre - half)),
    high: Math.min(1, Math.max(share, centre + half)),
  };
}
