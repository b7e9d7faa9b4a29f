import { NetworkOnly, Serwist, type PrecacheEntry } from "serwist";

/**
 * The service worker, bundled and given its list of files after the build (scripts/lib/service-worker.mjs). Every public page
 * is answered from that list, in the edition that came with this worker, so that page and scripts always fit each other. All else
 * goes to the network: the API, pages made at request time, short links. A new worker waits until the person asks for it.
 */
declare const precacheEntries: PrecacheEntry[];

const serwist = new Serwist({
  precacheEntries,
  // A calculator's input is in its address; the page is the same one for all of them.
  precacheOptions: { cleanupOutdatedCaches: true, ignoreURLParametersMatching: [/./], directoryIndex: null, cleanURLs: false, concurrency: 6 },
  skipWaiting: false, // asked for by the message SKIP_WAITING
  clientsClaim: true,
  navigationPreload: false,
  runtimeCaching: [{ matcher: ({ request }) => request.mode === "navigate", handler: new NetworkOnly() }],
  fallbacks: {
    entries: [
      { url: "/es/offline", matcher: ({ request }) => /^\/es(?:\/|$)/.test(new URL(request.url).pathname) },
      { url: "/offline", matcher: () => true },
    ],
  },
});

serwist.addEventListeners();
