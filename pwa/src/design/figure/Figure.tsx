import type { ReactNode } from 'react';
import './figure.css';

type FigureProps = {
  /** The figure with its unit: "83 %", "O 3", "−85 dBm". */
  readonly value: ReactNode;
  /** What it is: "heard", "typical score". */
  readonly label: string;
  /** Its 95 % interval, as "95 % 72–90". */
  readonly interval?: string;
  /** What it was made from: "58 of 70 · 31 dates". No figure without it. */
  readonly sample: string;
  /** Thin evidence (n < 5 or d < 3) looks thin, and says so. */
  readonly thin?: boolean;
};

/** A large figure with its interval and its sample. */
export function Figure({ value, label, interval, sample, thin = false }: FigureProps) {
  return (
    <div className={thin ? 'hm-figure hm-figure-thin' : 'hm-figure'}>
      <div className="hm-figure-value num">{value}</div>
      <div className="hm-figure-note num">
        {interval ? `${label} · ${interval}` : label}
        <br />
        {sample}
        {thin ? ' · thin' : ''}
      </div>
    </div>
  );
}

/** Figures side by side, wrapping where there is no room. */
export function FigureRow({ children }: { readonly children: ReactNode }) {
  return <div className="hm-figure-row">{children}</div>;
}
