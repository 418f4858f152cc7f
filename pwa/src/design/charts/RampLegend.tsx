import { rampOf } from '../scale/cividis';
import { useTheme } from '../theme/theme';
import './charts.css';

type RampLegendProps = {
  /** "0 %" and "100 % heard": what stands at both ends. */
  readonly from: string;
  readonly to: string;
  /** False where nothing on the screen can be thin. */
  readonly showThin?: boolean;
};

const STEPS = 34;

/** The ramp from its lowest to its highest, and what a small square means. */
export function RampLegend({ from, to, showThin = true }: RampLegendProps) {
  const ramp = rampOf(useTheme());
  return (
    <div className="hm-ramp num">
      <span>{from}</span>
      <svg viewBox={`0 0 ${STEPS * 5} 12`} preserveAspectRatio="none" aria-hidden="true">
        {Array.from({ length: STEPS }, (_, step) => (
          <rect key={step} x={step * 5} width="5.2" height="12" fill={ramp(step / (STEPS - 1))} />
        ))}
      </svg>
      <span>{to}</span>
      {showThin ? (
        <span className="hm-ramp-thin">
          <i aria-hidden="true" /> thin
        </span>
      ) : null}
    </div>
  );
}
