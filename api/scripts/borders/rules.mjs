import { apiDirection, apiFeatures, apiPlatform, apiSync } from './api-features.mjs';
import { appFeatures, appPackages, appRooms } from './app-rooms.mjs';
import { namedExports, noAny, noSilencedChecks, noSkippedTests, nothingLeftUndone } from './plain-code.mjs';
import { modelClock, modelImports } from './pure-model.mjs';
import { fileLength, folders, topLevel } from './sizes.mjs';
import { noRegistryHost, ownWords } from './words.mjs';

/** Each rule: { why, breaches(files) }, over files of { path, text }; the reason is what a newcomer reads at a breach. */
export const RULES = {
  ...{ modelImports, modelClock },
  ...{ appFeatures, appRooms, appPackages },
  ...{ apiFeatures, apiSync, apiPlatform, apiDirection },
  ...{ noAny, namedExports, noSkippedTests, noSilencedChecks, nothingLeftUndone },
  ...{ fileLength, folders, topLevel },
  ...{ noRegistryHost, ownWords },
};
