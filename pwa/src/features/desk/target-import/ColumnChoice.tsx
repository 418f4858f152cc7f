import { SelectField } from '../../../design/form/SelectField';
import type { TableFile } from './table-file';
import { COLUMN_MEANINGS, MEANING_WORDS, type ColumnMeaning } from './target-columns';
import '../desk.css';

const OPTIONS = COLUMN_MEANINGS.map((meaning) => ({ value: meaning, label: MEANING_WORDS[meaning] }));

type ColumnChoiceProps = {
  readonly file: TableFile;
  readonly meanings: readonly ColumnMeaning[];
  readonly onMeanings: (meanings: ColumnMeaning[]) => void;
};

/** What each column of the file holds; a meaning that is given again is taken from the column that had it. */
export function ColumnChoice({ file, meanings, onMeanings }: ColumnChoiceProps) {
  const choose = (at: number, meaning: ColumnMeaning): void =>
    onMeanings(meanings.map((before, i) => (i === at ? meaning : before === meaning ? 'ignore' : before)));
  return (
    <div className="desk-columns">
      {file.headers.map((header, at) => (
        <SelectField
          key={at}
          label={header === '' ? `Column ${at + 1}` : header}
          hint={exampleOf(file, at)}
          required
          options={OPTIONS}
          value={meanings[at] ?? 'ignore'}
          onChange={(meaning) => choose(at, meaning)}
        />
      ))}
    </div>
  );
}

function exampleOf(file: TableFile, at: number): string | undefined {
  const found = file.rows.find((row) => (row[at] ?? '').trim() !== '')?.[at]?.trim();
  return found === undefined ? undefined : `For example “${found.slice(0, 40)}”`;
}
