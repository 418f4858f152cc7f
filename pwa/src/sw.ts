import { cacheNames, clientsClaim } from 'workbox-core';
import {
  cleanupOutdatedCaches,
  createHandlerBoundToURL,
  getCacheKeyForURL,
  precacheAndRoute,
} from 'workbox-precaching';
import { NavigationRoute, registerRoute } from 'workbox-routing';

type ManifestEntry = { url: string; revision: string | null };
declare const self: ServiceWorkerGlobalScope & { __WB_MANIFEST: (ManifestEntry | string)[] };

const MAP_CACHE = 'harkmoor-map';
const entries = self.__WB_MANIFEST;

precacheAndRoute(entries);
cleanupOutdatedCaches();
registerRoute(new NavigationRoute(createHandlerBoundToURL('index.html'), { denylist: [/^\/api\//] }));
// the page puts the fine map into its cache after installation; here it is only read. Nothing else is cached, and
// nothing under /api ever is.
registerRoute(
  ({ url, sameOrigin }) => sameOrigin && /\/land-10m[^/]*\.json$/.test(url.pathname),
  async ({ request }) => (await (await caches.open(MAP_CACHE)).match(request)) ?? fetch(request),
);
clientsClaim(); // the first visit is controlled without a reload

self.addEventListener('message', (event) => {
  const message = event.data as { type?: string } | null;
  if (message?.type === 'SKIP_WAITING') void self.skipWaiting();
  if (message?.type === 'CLAIM') event.waitUntil(self.clients.claim());
  if (message?.type === 'COUNT_MISSING') event.waitUntil(answerMissing(event.ports[0]));
});

/** Answers with the number of installed files that are not in the cache, looked at one by one; then fetches them again. */
async function answerMissing(port: MessagePort | undefined): Promise<void> {
  const urls = entries.map((entry) => (typeof entry === 'string' ? entry : entry.url));
  const found = await Promise.all(urls.map(async (url) => (await caches.match(keyOf(url))) !== undefined));
  const missing = urls.filter((_, index) => !found[index]);
  port?.postMessage({ missing: missing.length, total: urls.length });
  await Promise.all(missing.map(fetchAgain));
}

/** A browser that ran out of room may have thrown out a single file; without signal it stays missing, and is told. */
async function fetchAgain(url: string): Promise<void> {
  const response = await fetch(url, { cache: 'reload' }).catch(() => null);
  if (response?.ok) await (await caches.open(cacheNames.precache)).put(keyOf(url), response);
}

function keyOf(url: string): string {
  const key = getCacheKeyForURL(url);
  if (key === undefined) throw new Error(`${url} is not among the installed files`);
  return key;
}
