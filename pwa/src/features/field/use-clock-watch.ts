import { useEffect, useEffectEvent, useRef } from 'react';
import { createStepDetector } from '../../platform/clock';
import { useMinute } from '../../platform/tick';
import { onVisibilityChange } from '../../platform/visibility';

/** Tells of each jump of the device clock while the screen is up. It looks once a minute and at each return. */
export function useClockWatch(onStep: (step: { at: number; stepMs: number }) => void): void {
  const detector = useRef<ReturnType<typeof createStepDetector> | null>(null);
  const minuteMs = useMinute();
  const look = useEffectEvent((afterSleep: boolean) => {
    detector.current ??= createStepDetector();
    const step = detector.current.look(afterSleep);
    if (step) onStep({ at: Math.round(step.atMs), stepMs: Math.round(step.stepMs) });
  });
  useEffect(() => look(false), [minuteMs]);
  // nothing is looked at while hidden, so what a sleep did to the clocks is seen, and forgiven, at the return
  useEffect(() => onVisibilityChange((visible) => look(visible)), []);
}
