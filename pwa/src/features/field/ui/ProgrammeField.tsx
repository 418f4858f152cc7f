import { Button } from '../../../design/button/Button';
import { TextField } from '../../../design/form/TextField';
import { utcTime } from '../../../platform/utc-text';
import { cleanText } from '../pad-values';
import type { PadForm } from '../use-pad-form';

const DETAILS_MAX = 100;

/** Programme details, each with the moment at which its first letter was typed: what a station wants to read. */
export function ProgrammeField({ form }: { readonly form: PadForm }) {
  const { programme, programmeText, programmeAt } = form.values;
  const isFull = programme.length >= DETAILS_MAX;
  const type = (text: string): void =>
    form.change({ programmeText: text, programmeAt: text === '' ? null : (programmeAt ?? Date.now()) });
  const add = (): void => {
    const text = cleanText(programmeText);
    if (text === null) return;
    const detail = { at: programmeAt ?? Date.now(), text };
    form.change({ programme: [...programme, detail], programmeText: '', programmeAt: null });
  };
  return (
    <section aria-label="Programme details">
      {programme.length > 0 ? (
        <ol className="fd-programme">
          {programme.map(({ at, text }, index) => (
            <li key={`${at}-${index}`}>
              <span className="num">{utcTime(at)}</span> {text}
              <button
                type="button"
                aria-label={`Take out: ${text}`}
                onClick={() => form.change({ programme: programme.filter((_, other) => other !== index) })}
              >
                ✕
              </button>
            </li>
          ))}
        </ol>
      ) : null}
      {isFull ? (
        <p className="soft">{DETAILS_MAX} details are the most that one entry holds.</p>
      ) : (
        <>
          <TextField
            label="Programme detail"
            hint={
              programmeAt === null
                ? 'The time is taken at the first letter.'
                : `Heard ${utcTime(programmeAt)} UTC`
            }
            maxLength={300}
            value={programmeText}
            onChange={type}
          />
          <Button look="outline" disabled={cleanText(programmeText) === null} onClick={add}>
            Add, and another
          </Button>
        </>
      )}
    </section>
  );
}
