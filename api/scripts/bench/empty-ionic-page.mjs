import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { build } from 'vite';

const PAGE = '<!doctype html><meta charset="utf-8"><title>Empty</title><div id="root"></div>';
const SCRIPT = `
import { createElement as h } from 'react';
import { createRoot } from 'react-dom/client';
import { IonApp, IonContent, IonPage, setupIonicReact } from '@ionic/react';
import '@ionic/react/css/core.css';
setupIonicReact({ mode: 'md' });
const page = h(IonPage, null, h(IonContent, null, h('p', { className: 'empty-page' }, 'Empty')));
createRoot(document.getElementById('root')).render(h(IonApp, null, page));
`;

/** Builds a page of Ionic and React with nothing on it; resolves to its folder and the bytes of its scripts by name. */
export async function buildEmptyIonicPage(root) {
  const folder = fs.mkdtempSync(path.join(root, 'node_modules/.empty-ionic-'));
  const outDir = fs.mkdtempSync(path.join(os.tmpdir(), 'harkmoor-empty-'));
  try {
    fs.writeFileSync(
      path.join(folder, 'index.html'),
      `${PAGE}<script type="module" src="/main.js"></script>`,
    );
    fs.writeFileSync(path.join(folder, 'main.js'), SCRIPT);
    await build({ root: folder, configFile: false, logLevel: 'error', build: { outDir, emptyOutDir: true } });
  } finally {
    fs.rmSync(folder, { recursive: true, force: true });
  }
  return outDir;
}
