import { importsOf, isTest, isTypeScript } from './source-files.mjs';

/** What each room of the app may reach besides itself, packages and the model. `app/` composes, so it may reach all. */
const REACHES = {
  design: ['platform'],
  platform: [],
  store: ['platform'],
  sync: ['platform', 'store'],
};

export const appFeatures = {
  why: 'a feature of the app imports design, platform, sync-model and its own files, and store in its data/ folder; never another feature (app/ composes)',
  breaches(files) {
    return appFiles(files).flatMap((file) => {
      const [, feature, place] = /^pwa\/src\/features\/([^/]+)\/(.*)$/.exec(file.path) ?? [];
      if (!feature) return [];
      const allowed = [
        'pwa/src/design/',
        'pwa/src/platform/',
        'sync-model/src/',
        `pwa/src/features/${feature}/`,
      ];
      if (place.startsWith('data/') || isTest(file)) allowed.push('pwa/src/store/');
      return breachesOf(file, allowed);
    });
  },
};

export const appRooms = {
  why: 'the rooms of the app have one direction: platform and design, then store and sync, then features, then app',
  breaches(files) {
    return appFiles(files).flatMap((file) => {
      const [, room] = /^pwa\/src\/([^/]+)\//.exec(file.path) ?? [];
      if (!room || !(room in REACHES)) return [];
      const allowed = [room, ...REACHES[room]].map((each) => `pwa/src/${each}/`);
      if (isTest(file)) allowed.push('pwa/public/'); // what is served as it stands is tested beside its kin
      return breachesOf(file, [...allowed, 'sync-model/src/']);
    });
  },
};

export const appPackages = {
  why: 'Dexie is reached through store or the data/ folder of a feature; the app knows no server framework and no Node built-in',
  breaches(files) {
    return appFiles(files)
      .filter((file) => !isTest(file))
      .flatMap((file) => {
        const holdsData = /^pwa\/src\/(store|sync|app)\/|^pwa\/src\/features\/[^/]+\/data\//.test(file.path);
        return importsOf(file)
          .filter(
            ({ name }) =>
              /^(@nestjs|@mikro-orm|node:|@harkmoor\/api)/.test(name) || (name === 'dexie' && !holdsData),
          )
          .map(({ name, line }) => `${file.path}:${line} imports ${name}`);
      });
  },
};

function appFiles(files) {
  return files.filter((file) => file.path.startsWith('pwa/src/') && isTypeScript(file));
}

function breachesOf(file, allowed) {
  return importsOf(file)
    .filter(({ target }) => target !== null && !allowed.some((place) => `${target}/`.startsWith(place)))
    .map(({ name, line }) => `${file.path}:${line} imports ${name}`);
}
