import { useId, type ReactNode } from 'react';
import './section.css';

type SectionProps = {
  readonly title: string;
  /** A small act or figure at the right of the title. */
  readonly aside?: ReactNode;
  readonly children: ReactNode;
};

/** A titled part of a page, ruled off from the next. No cards inside cards. */
export function Section({ title, aside, children }: SectionProps) {
  const id = useId();
  return (
    <section className="hm-section" aria-labelledby={id}>
      <div className="hm-section-head">
        <h2 id={id}>{title}</h2>
        {aside}
      </div>
      {children}
    </section>
  );
}
