import { useRef, useState } from 'react';
import { Button } from '../../../design/button/Button';
import { readTableFile, type TableFile } from './table-file';
import type { ColumnMeaning } from './target-columns';

type FilePartProps = { readonly onFile: (file: TableFile, meanings: readonly ColumnMeaning[]) => void };

/** Chooses the file; what cannot be read is said in words. */
export function FilePart({ onFile }: FilePartProps) {
  const input = useRef<HTMLInputElement>(null);
  const [trouble, setTrouble] = useState<string | null>(null);

  async function read(file: File | undefined): Promise<void> {
    if (!file) return;
    const answer = await readTableFile(file);
    if (input.current) input.current.value = '';
    if (answer.kind === 'refused') setTrouble(answer.message);
    else onFile(answer.file, answer.meanings);
  }
  return (
    <>
      <p>
        A table saved as CSV, with a header row. Its columns may have any names and order; you match them in
        the next step. Nothing is imported before you have looked at it.
      </p>
      {trouble ? <p role="alert">{trouble}</p> : null}
      <Button onClick={() => input.current?.click()}>Choose a file</Button>
      <input
        ref={input}
        type="file"
        accept=".csv,.txt,text/csv,text/plain"
        hidden
        aria-label="CSV file of targets"
        onChange={(event) => void read(event.target.files?.[0])}
      />
    </>
  );
}
