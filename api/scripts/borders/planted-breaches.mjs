/**
 * For each rule, small projects in memory: `breach` must be found by it, `fine` must not. A file is [path, text].
 * The texts are assembled where the project's own rules would take them for a breach of this file.
 */
const MANIFEST = ['sync-model/package.json', '{"dependencies":{"zod":"1"},"devDependencies":{"vitest":"1"}}'];
const model = (text, path = 'sync-model/src/merge/a.ts') => [MANIFEST, [path, text]];
const one = (path, text = '') => [[path, text]];
const field = 'pwa/src/features/field/pad.tsx';
const clubsModule = [
  'api/src/clubs/clubs.module.ts',
  "import { ClubAccess } from './club-access.js';\n@Module({ providers: [ClubAccess], exports: [ClubAccess] })\nexport class ClubsModule {}",
];
const fromAccounts = (name) => [clubsModule, ['api/src/accounts/a.ts', `import { x } from '${name}';`]];

export const PLANTED = {
  modelImports: {
    breach: [
      model("import fs from 'node:fs';"),
      model("import { useState } from 'react';"),
      model("export { x } from '../../../api/src/main.js';"),
      model("type X = import('@nestjs/common').X;"),
      model("const x = await import('dexie');"),
      model("import { it } from 'vitest';"),
    ],
    fine: [
      model("import { z } from 'zod'; import { y } from '../stamp/stamp.js';"),
      model("import { it } from 'vitest'; import fs from 'node:fs';", 'sync-model/src/a.test.ts'),
    ],
  },
  modelClock: {
    breach: [
      model('const t = Date.now();'),
      model('const x = Math.random();'),
      model('const d = new Date();'),
      model('const d = Date();'),
      model('const f = Math.random;'),
      model('const id = crypto.randomUUID();', 'sync-model/simulation/fleet.ts'),
    ],
    fine: [model('const d = new Date(atMs); // never Date.now()'), model("const s = 'new Date()';")],
  },
  appFeatures: {
    breach: [
      one(field, "import { x } from '../logbook/list';"),
      one(field, "import { x } from '../../store/database';"),
      one(field, "const x = import('../../app/routes');"),
      one('pwa/src/features/field/data/a.ts', "import { x } from '../../logbook/data/b';"),
      one('pwa/src/features/field/a.test.ts', "import { x } from '../logbook/list';"),
      one(field, "import { x } from '../../sync/pacing';"),
    ],
    fine: [
      one(
        field,
        "import { x } from '../../design/keys/keys'; import './pad.css'; import { y } from './data/y';",
      ),
      one('pwa/src/features/field/data/a.ts', "import { x } from '../../../store/database';"),
      one(
        field,
        "import { mergeRecord } from '@harkmoor/sync-model/merge/merge-record'; import React from 'react';",
      ),
      one('pwa/src/app/routes.tsx', "import { x } from '../features/field/pad';"),
    ],
  },
  appRooms: {
    breach: [
      one('pwa/src/design/keys.tsx', "import { x } from '../features/field/pad';"),
      one('pwa/src/platform/clock.ts', "import { x } from '../store/database';"),
      one('pwa/src/design/keys.tsx', "import type { X } from '../store/database';"),
      one('pwa/src/store/database.ts', "import { x } from '../features/field/pad';"),
      one('pwa/src/sync/pacing.ts', "import { x } from '../app/compose';"),
    ],
    fine: [
      one(
        'pwa/src/sync/link.ts',
        "import { x } from '../store/database'; import { y } from '../platform/clock';",
      ),
    ],
  },
  appPackages: {
    breach: [
      one(field, "import Dexie from 'dexie';"),
      one('pwa/src/design/a.ts', "import x from 'node:path';"),
    ],
    fine: [
      one('pwa/src/store/a.ts', "import Dexie from 'dexie';"),
      one('pwa/src/a.test.ts', "import x from 'node:path';"),
    ],
  },
  apiFeatures: {
    breach: [fromAccounts('../clubs/club.entity.js'), fromAccounts('../clubs/deep/secret.js')],
    fine: [
      fromAccounts('../clubs/clubs.module.js'),
      fromAccounts('../clubs/club-access.js'),
      fromAccounts('../platform/clock/clock.js'),
      fromAccounts('../sync/column-types.js'),
    ],
  },
  apiSync: {
    breach: [one('api/src/sync/a.ts', "import { x } from '../clubs/clubs.module.js';")],
    fine: [
      one('api/src/sync/a.ts', "import { x } from '../platform/clock/clock.js'; import { y } from './b.js';"),
    ],
  },
  apiPlatform: {
    breach: [one('api/src/platform/a.ts', "import { x } from '../mail/mail.module.js';")],
    fine: [one('api/src/app.module.ts', "import { x } from './mail/mail.module.js';")],
  },
  apiDirection: {
    breach: [
      one('api/src/clubs/club.entity.ts', "import { HttpException } from '@nestjs/common';"),
      one('api/src/clubs/a.ts', "import { x } from '../../../pwa/src/store/database';"),
    ],
    fine: [one('api/src/clubs/club.entity.ts', "import { Entity } from '@mikro-orm/core';")],
  },
  noAny: {
    breach: [one('pwa/src/a.ts', 'const x: any = 1;'), one('api/src/a.ts', 'const x = y as any;')],
    fine: [one('pwa/src/a.ts', "const any = 'any'; // any: any")],
  },
  namedExports: {
    breach: [
      one('pwa/src/a.tsx', 'export default function A() {}'),
      one('api/src/a.ts', 'const a = 1; export default a;'),
    ],
    fine: [
      one('pwa/src/a.ts', 'switch (x) { default: y(); } export const z = 1;'),
      one('pwa/vite.config.ts', 'export default {};'),
    ],
  },
  noSkippedTests: {
    breach: [
      one('pwa/src/a.test.ts', "it.skip('x', () => {});"),
      one('api/test/a.test.ts', "describe.only('x', () => {});"),
      one('api/test/a.test.ts', "test.skip.each([1])('x', () => {});"),
      one('api/test/a.test.ts', "xit('x', () => {});"),
    ],
    fine: [
      one('pwa/src/a.test.ts', "it('should skip', () => { rows.skip(1); });"),
      one('pwa/src/a.ts', 'db.only();'),
    ],
  },
  noSilencedChecks: {
    breach: [
      one('pwa/src/a.ts', '// @ts-' + 'ignore'),
      one('pwa/src/a.ts', '// eslint-disable-next-line no-console'),
    ],
    fine: [one('pwa/src/a.ts', '// eslint-disable-next-line no-console -- a script speaks on the console')],
  },
  nothingLeftUndone: {
    breach: [one('pwa/src/a.ts', '// TO' + 'DO later')],
    fine: [one('pwa/src/a.ts', "const score = '4XXX3';")],
  },
  fileLength: {
    breach: [one('pwa/src/a.ts', 'x;\n'.repeat(201)), one('api/scripts/a.mjs', 'x;\n'.repeat(201))],
    fine: [one('pwa/src/a.ts', 'x;\n'.repeat(200)), one('api/migrations/a.ts', 'x;\n'.repeat(900))],
  },
  folders: {
    breach: [one('pwa/src/utils/a.ts'), one('api/src/clubs/helpers/a.ts'), one('pwa/src/design/index.ts')],
    fine: [one('pwa/index.html'), one('sync-model/src/records/common-fields.ts')],
  },
  topLevel: {
    breach: [one('docs/a.md'), one('notes.md')],
    fine: [one('api/docs/a.md'), one('README.md'), one('.ci/run')],
  },
  noRegistryHost: {
    breach: [
      one('a.md', 'from https://reg' + 'istry.npm' + 'js.org/x'),
      one('package-lock.json', '"resolved": ' + '"https://x.example/a.tgz"'),
    ],
    fine: [one('a.md', 'see https://www.itu.int/'), one('package-lock.json', '"resolved": "sync-model"')],
  },
  ownWords: {
    breach: [one('a.md', ['as in Fl', 'digi'].join('')), one('a.md', 'in /wo' + 'rk/main')],
    fine: [one('a.md', 'the net/work/load of a session, its issue and its tools')],
  },
};
