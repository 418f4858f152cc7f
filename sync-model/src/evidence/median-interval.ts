/** Below this an exact 95 % interval of a median does not exist: 2 × 2⁻⁵ is more than 5 %. */
export const MEDIAN_N_MIN = 6;

const Z = 1.959963984540054;
/** Above this 2⁻ⁿ leaves the range of a number; the normal approximation is then right to a rank. */
const EXACT_N_MAX = 1000;

/**
 * Ranks (1 = lowest) of the two values in order that hold the median between them with at least 95 %, whatever
 * the distribution: the order-statistic interval of the sign test. Null under six values.
 */
export function medianRanks(n: number): { low: number; high: number } | null {
  if (n < MEDIAN_N_MIN) return null;
  const below = n <= EXACT_N_MAX ? exactBelow(n) : Math.floor((n - 1 - Z * Math.sqrt(n)) / 2);
  return { low: below + 1, high: n - below };
}

/** The largest k with P(X ≤ k) ≤ 2.5 % for X binomial with n and ½. */
function exactBelow(n: number): number {
  let probability = 2 ** -n;
  let sum = 0;
  for (let k = 0; ; k++) {
    sum += probability;
    if (sum > 0.025) return k - 1;
    probability *= (n - k) / (k + 1);
  }
}
