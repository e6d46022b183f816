import { Serwist, type PrecacheEntry } from 'serwist';

// The build writes the list of the field page's files in here.
declare const ROUND_FILES: PrecacheEntry[];

/**
 * Keeps the field page's own files on the phone and answers with them, whatever stands in the query. Everything else,
 * the interface before all, goes to the network untouched. A newer version waits until the page lets it in.
 */
const serwist = new Serwist({
  precacheEntries: ROUND_FILES,
  precacheOptions: { cleanupOutdatedCaches: true, ignoreURLParametersMatching: [/.*/], cleanURLs: false, directoryIndex: null },
  skipWaiting: false,
  clientsClaim: true,
  navigationPreload: false,
  disableDevLogs: true,
});

serwist.addEventListeners();
