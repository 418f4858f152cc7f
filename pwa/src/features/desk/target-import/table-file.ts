import { parse } from 'papaparse';
import { guessMeanings, type ColumnMeaning } from './target-columns';

export type TableFile = {
  readonly name: string;
  readonly headers: readonly string[];
  readonly rows: readonly (readonly string[])[];
  /** The number that a spreadsheet gives to the first of `rows`. */
  readonly firstRow: number;
};

export type ReadFile =
  { kind: 'table'; file: TableFile; meanings: ColumnMeaning[] } | { kind: 'refused'; message: string };

const ROWS_MAX = 5000;
const BYTES_MAX = 5 * 1024 * 1024;

/** Reads a CSV file with a header row; the delimiter is found by the parser. */
export async function readTableFile(file: Pick<File, 'name' | 'size' | 'text'>): Promise<ReadFile> {
  if (file.size > BYTES_MAX) return { kind: 'refused', message: 'The file is larger than 5 MB. Split it.' };
  const text = (await file.text()).replace(/^\uFEFF/, '');
  if (text.includes('\0'))
    return { kind: 'refused', message: 'This is no text file. Save the table as CSV first.' };
  const { data, errors } = parse<string[]>(text, { skipEmptyLines: false });
  const quote = errors.find((error) => error.type === 'Quotes');
  if (quote) {
    return {
      kind: 'refused',
      message: `Row ${(quote.row ?? 0) + 1}: a quotation mark is not closed. Nothing was read.`,
    };
  }
  const [headers, ...rows] = data;
  if (!headers || rows.every((row) => row.every((cell) => cell.trim() === ''))) {
    return { kind: 'refused', message: 'The file has no rows below its header.' };
  }
  if (rows.length > ROWS_MAX)
    return { kind: 'refused', message: `The file has more than ${ROWS_MAX} rows. Split it.` };
  return {
    kind: 'table',
    file: { name: file.name, headers: headers.map((header) => header.trim()), rows, firstRow: 2 },
    meanings: guessMeanings(headers),
  };
}
