import './figure.css';

type ProgressBarProps = {
  /** What is being counted: "Round 3", "Entries read". */
  readonly label: string;
  readonly done: number;
  readonly total: number;
  /** In words, where "5 of 12" is not enough. */
  readonly valueText?: string;
};

/** A thin bar of work done. The figures stand beside it in text: the bar alone is never the only sign. */
export function ProgressBar({ label, done, total, valueText }: ProgressBarProps) {
  const share = total > 0 ? Math.min(1, Math.max(0, done / total)) : 0;
  return (
    <div
      className="hm-progress"
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={total}
      aria-valuenow={done}
      aria-valuetext={valueText ?? `${done} of ${total}`}
    >
      <div style={{ width: `${share * 100}%` }} />
    </div>
  );
}
