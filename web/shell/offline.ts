import { isOffline, isStored, newVersion } from '../state/network.ts';

let waiting: ServiceWorker | null = null;

/** Lets the newer version in, or loads the page again where another tab let it in; what stands in the fields was kept by then. */
const takeNewVersion = (): void => {
  const { serviceWorker } = navigator;
  if (!waiting) location.reload();
  serviceWorker.addEventListener('controllerchange', () => location.reload(), { once: true });
  waiting?.postMessage('take over');
};

const watch = (registration: ServiceWorkerRegistration): void => {
  const note = () => {
    isStored.value = registration.active !== null;
    waiting = registration.waiting;
    newVersion.value = waiting !== null && registration.active !== null ? takeNewVersion : null;
  };
  note();
  const follow = (worker: ServiceWorker | null) => worker?.addEventListener('statechange', note);
  follow(registration.installing);
  registration.addEventListener('updatefound', () => follow(registration.installing));
};

/** Stores the page for use without a network, and watches the network. */
export const goOffline = async (): Promise<void> => {
  const note = () => {
    isOffline.value = !navigator.onLine;
  };
  note();
  addEventListener('online', note);
  addEventListener('offline', note);
  if (!('serviceWorker' in navigator)) return;
  if (navigator.serviceWorker.controller) {
    navigator.serviceWorker.addEventListener('controllerchange', () => {
      waiting = null;
      newVersion.value = takeNewVersion;
    });
  }
  try {
    watch(await navigator.serviceWorker.register('./sw.js'));
  } catch {
    isStored.value = false;
  }
};
