/** Our mark: a signal comes down in an arc onto the line of a moor. Drawn in the theme's colours. */
export function Mark({ size = 48 }: { readonly size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 64 64" fill="none" strokeLinecap="round" aria-hidden="true">
      <path d="M3 50C17 49 25 39 38 39c10 0 15 6 23 9" stroke="var(--ink)" strokeWidth="5" />
      <path d="M7 38C9 14 36 6 40 27" stroke="var(--heather)" strokeWidth="5" />
      <circle cx="40" cy="30" r="4.5" fill="var(--heather)" />
    </svg>
  );
}
