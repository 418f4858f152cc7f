import type { ReactNode } from 'react';

export type Fact = { readonly name: string; readonly value: ReactNode; readonly note?: ReactNode };

/** What is known, one line each: its name, its value, and under it on what it rests. Null and false leave a line out. */
export function Facts({ facts }: { readonly facts: readonly (Fact | null | false)[] }) {
  return (
    <dl className="log-facts">
      {facts.map((fact) =>
        fact ? (
          <div key={fact.name}>
            <dt>{fact.name}</dt>
            <dd>
              <span className="num">{fact.value}</span>
              {fact.note ? <span className="log-fact-note num">{fact.note}</span> : null}
            </dd>
          </div>
        ) : null,
      )}
    </dl>
  );
}
