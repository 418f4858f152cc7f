import type { DialRing, DialRings } from '@harkmoor/sync-model/evidence/hour-dial';
import { NO_RATE_WORDS } from '@harkmoor/sync-model/evidence/heard-rate';
import { centreOf } from '@harkmoor/sync-model/radio/locator/locator';
import { useMemo } from 'react';
import { HourDial, type DialRingFigures } from '../../../design/charts/HourDial';
import { RampLegend } from '../../../design/charts/RampLegend';
import { SegmentedControl } from '../../../design/choice/SegmentedControl';
import { Section } from '../../../design/layout/Section';
import { figureText, shortDate } from '../../../platform/utc-text';
import type { EvidenceAnswer, Overview } from '../answers/questions';
import { channelWords } from '../view/channel-words';
import type { CoverageView } from '../view/coverage-view';
import { shownSubject } from '../view/evidence-filters';
import { rateSentence } from '../view/figure-words';
import { middleDayMs } from '../view/months';
import { counted, datesWords, shownMonths } from '../view/scope-words';
import { sunParts } from '../view/sun-parts';
import { DialTable } from './DialTable';

type SquareDialProps = {
  readonly view: CoverageView;
  readonly overview: Overview;
  readonly dial: EvidenceAnswer['dial'];
  readonly rings: DialRings;
  readonly onRings: (rings: DialRings) => void;
};

const RING_CHOICES = [
  { value: 'channels', label: 'Channels' },
  { value: 'bands', label: 'Bands' },
] as const;

/** The hour dial of a square over all hours, with the sun there on the middle day of the dates, and its table. */
export function SquareDial({ view, overview, dial, rings, onRings }: SquareDialProps) {
  const place = view.square ?? 'All squares';
  const dayMs = middleDayMs(shownMonths(view, overview));
  const sunAt = view.square ?? overview.locators[Math.floor(overview.locators.length / 2)];
  const rim = useMemo(
    () => (dayMs === null || sunAt === undefined ? [] : sunParts(centreOf(sunAt), dayMs)),
    [dayMs, sunAt],
  );
  const figures = useMemo(() => dial.rings.map((ring) => ringFigures(ring, rings)), [dial.rings, rings]);
  const names = figures.map(({ label }) => label);
  return (
    <Section title="Hour by hour">
      <div className="cov-dial-choice">
        <SegmentedControl label="Rings of the dial" options={RING_CHOICES} value={rings} onChange={onRings} />
      </div>
      <HourDial
        label={`Hour dial of ${place}, UTC`}
        title={place}
        note={`${figureText(dial.n)} obs.`}
        rings={figures}
        rim={rim}
      />
      <RampLegend from="0 %" to="100 % heard" />
      <p className="small soft num">
        {scopeOf(view, overview, rings)}, {datesWords(view, overview)}
        {dayMs === null ? '' : `; sun of ${shortDate(dayMs)}`}. Rings from the middle:{' '}
        {names.join(', ') || 'none'}.
        {dial.ringsLeftOut > 0 ? ` ${counted(dial.ringsLeftOut, 'ring')} less tried left out.` : ''}
      </p>
      {figures.length > 0 && figures.every(({ cells }) => cells.every(({ share }) => share === null)) ? (
        <p className="small">{NO_RATE_WORDS['too-few-channels']}</p>
      ) : null}
      <DialTable rings={figures} place={place} />
    </Section>
  );
}

function scopeOf(view: CoverageView, overview: Overview, rings: DialRings): string {
  const subject = shownSubject(view, overview);
  if (rings === 'bands') return 'All bands and hours';
  return subject.kind === 'band' ? `Channels of ${subject.key}, all hours` : 'All channels and hours';
}

function ringFigures({ key, cells }: DialRing, rings: DialRings): DialRingFigures {
  return {
    key,
    label: rings === 'bands' ? key : channelWords(key),
    cells: cells.map((cell) => ({
      share: cell.rate,
      isThin: cell.isThin,
      isTried: cell.n > 0,
      words: rateSentence(cell),
    })),
  };
}
