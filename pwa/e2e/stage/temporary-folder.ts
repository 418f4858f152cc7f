import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll } from 'vitest';

/** A folder for the files of one journey; it goes with the journey. */
export function temporaryFolder(): () => string {
  let folder = '';
  beforeAll(() => {
    folder = fs.mkdtempSync(path.join(os.tmpdir(), 'harkmoor-journey-'));
  });
  afterAll(() => fs.rmSync(folder, { recursive: true, force: true }));
  return () => folder;
}
