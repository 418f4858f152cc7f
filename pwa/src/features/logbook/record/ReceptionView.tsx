import { useMemo } from 'react';
import type { HeldReception } from '../data/held-reception';
import { useReceptionActs } from '../data/use-reception-acts';
import { AboutSection, WithSection } from './AboutSection';
import { ChangesSection } from './ChangesSection';
import { derive } from './derive';
import { PlaceSection } from './PlaceSection';
import { ReadingSection } from './ReadingSection';
import { ScoreSection } from './ScoreSection';
import { StateSection } from './StateSection';
import './record.css';

/** Everything that is known of one reception: what was read, what follows from it, and what became of it. */
export function ReceptionView({ held }: { readonly held: HeldReception }) {
  const acts = useReceptionActs(held.record.id);
  const derived = useMemo(() => derive(held), [held]);
  return (
    <div className="log-record">
      <StateSection held={held} acts={acts} />
      <ScoreSection fields={held.record.fields} />
      <ReadingSection held={held} derived={derived} />
      <AboutSection held={held} derived={derived} />
      <PlaceSection held={held} atMs={derived.time.atMs} />
      <WithSection held={held} />
      <ChangesSection held={held} acts={acts} />
    </div>
  );
}
