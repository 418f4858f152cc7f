import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { utcHourMinute } from '../../../platform/utc-text';
import type { StoredReception } from '../data/outing-entries';
import { outcomeWords } from '../words';
import './other-entries.css';

type OtherEntriesProps = {
  /** Entries outside the rounds, in the order in which they were made. */
  readonly entries: readonly StoredReception[];
  readonly setupLabel: (setupId: string) => string;
  readonly targetName: (targetId: string | null) => string | null;
  readonly onEdit: (entry: StoredReception) => void;
};

const BASIS_WORDS = {
  round: 'round',
  planned: 'planned',
  chance: 'by chance',
  swap: 'swap test',
  import: 'import',
};

/** What was entered by frequency in this outing, newest first; each opens for editing. */
export function OtherEntries({ entries, setupLabel, targetName, onEdit }: OtherEntriesProps) {
  if (entries.length === 0) return null;
  return (
    <section className="fd-others" aria-labelledby="fd-others">
      <h2 id="fd-others">Other entries</h2>
      <ul>
        {[...entries].reverse().map((entry) => {
          const { tuning, stationName, targetId, basis, deviceAt, setupId } = entry.fields;
          const name = stationName ?? targetName(targetId);
          const words = outcomeWords(entry.fields);
          return (
            <li key={entry.id}>
              <button type="button" className="fd-other-entry num" onClick={() => onEdit(entry)}>
                <span>
                  <b>{frequencyText(tuning.dialHz)}</b>
                  <small>{[name, BASIS_WORDS[basis]].filter(Boolean).join(' · ')}</small>
                </span>
                <span className="fd-other-done">
                  <b>{words}</b>
                  <small>
                    {setupLabel(setupId)} · {utcHourMinute(deviceAt)}
                    <span className="only-heard"> UTC. Edit</span>
                  </small>
                </span>
              </button>
            </li>
          );
        })}
      </ul>
    </section>
  );
}
