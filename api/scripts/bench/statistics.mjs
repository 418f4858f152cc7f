/** Median, 99th percentile (nearest rank) and worst of some measurements. */
export function summary(values) {
  const sorted = [...values].sort((a, b) => a - b);
  const rank = (share) => sorted[Math.min(sorted.length - 1, Math.ceil(share * sorted.length) - 1)];
  return { n: sorted.length, median: rank(0.5), p99: rank(0.99), worst: sorted.at(-1) };
}

/** "412 ms, worst 530 of 5". */
export function summaryWords({ n, median, worst }) {
  const digits = median < 100 ? 1 : 0;
  return `${median.toFixed(digits)} ms, worst ${worst.toFixed(digits)} of ${n}`;
}
