import { useId } from 'react';

/** Our mark: a signal comes down in an arc onto a hill of the moor. Drawn in the theme's colours. */
export function Mark({ sizePx = 52 }: { readonly sizePx?: number }) {
  const clip = useId();
  return (
    <svg width={sizePx} height={sizePx} viewBox="0 0 512 512" fill="none" aria-hidden="true">
      <clipPath id={clip}>
        <rect width="512" height="512" rx="112" />
      </clipPath>
      <g clipPath={`url(#${clip})`}>
        <rect width="512" height="512" fill="var(--land)" />
        <path
          d="M-120 432C70 428 210 344 338 344c92 0 150 56 300 76V660H-120Z"
          fill="var(--mark-hill, var(--ink))"
        />
        <path d="M-70 330C20 84 296 80 336 304" stroke="var(--heather)" strokeWidth="42" />
        <circle cx="338" cy="318" r="48" fill="var(--heather)" />
      </g>
    </svg>
  );
}
