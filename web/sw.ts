/** Written by the build: every file of this version, and a name for the version. */
declare const FILES: readonly string[];
declare const VERSION: string;

declare const self: ServiceWorkerGlobalScope;

const NAME = 'copewright-';
const STORE = NAME + VERSION;

/** Everything is stored before this version serves a page; the version before goes on serving its own pages until they let it go. */
self.addEventListener('install', (event) => {
  event.waitUntil(caches.open(STORE).then((store) => store.addAll(['./', ...FILES])));
});

self.addEventListener('message', (event) => {
  if (event.data === 'take over') void self.skipWaiting();
});

const forgetOthers = async (): Promise<void> => {
  const names = await caches.keys();
  await Promise.all(names.filter((name) => name.startsWith(NAME) && name !== STORE).map((name) => caches.delete(name)));
};

/** The page that brought this version in is served by it at once, so that what it loads later is there without a network too. */
self.addEventListener('activate', (event) => {
  event.waitUntil(forgetOthers().then(() => self.clients.claim()));
});

/** A page as this version has it: it and the files it names belong together. */
const page = async (request: Request): Promise<Response> => {
  const store = await caches.open(STORE);
  return (await store.match('./')) ?? fetch(request);
};

const file = async (request: Request): Promise<Response> => {
  const store = await caches.open(STORE);
  return (await store.match(request, { ignoreSearch: true })) ?? fetch(request);
};

self.addEventListener('fetch', (event) => {
  const { request } = event;
  if (request.method !== 'GET' || !request.url.startsWith(self.registration.scope)) return;
  if (request.mode === 'navigate') {
    // Other pages of the same place, such as an API's description, are not the bench.
    const here =
      new URL(request.url).pathname.replace(/index\.html$/, '') === new URL(self.registration.scope).pathname;
    if (here) event.respondWith(page(request));
    return;
  }
  event.respondWith(file(request));
});

export type {};
