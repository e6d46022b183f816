import type { Round } from './round';
import { readAddress } from './round-place';

/** Screens on which nothing is being typed: there a newer version may take over. */
const calmScreens = new Set(['today', 'kept', 'row']);

/**
 * Registers the worker that keeps this page on the phone. A newer version that is ready waits until no draft stands and
 * no screen is being typed into; then it takes over and the page is loaded anew. What is kept is not touched by it.
 */
export function watchWorker(round: Round): () => void {
  if (!('serviceWorker' in navigator)) return () => undefined;
  let registration: ServiceWorkerRegistration | undefined;
  let stopped = false;
  const mayChange = () => !round.hasDrafts() && calmScreens.has(readAddress(window.location.search).at);
  const letIn = () => {
    if (registration?.waiting && mayChange()) registration.waiting.postMessage({ type: 'SKIP_WAITING' });
  };
  let controlled = navigator.serviceWorker.controller !== null;
  const onChanged = () => {
    // The very first worker takes over a page that is already of its own version.
    if (controlled && mayChange()) window.location.reload();
    controlled = true;
  };
  navigator.serviceWorker.addEventListener('controllerchange', onChanged);
  void navigator.serviceWorker
    .register('/round-worker.js', { scope: '/round', updateViaCache: 'none' })
    .then((made) => {
      if (stopped) return;
      registration = made;
      made.addEventListener('updatefound', () => {
        made.installing?.addEventListener('statechange', () => letIn());
      });
      letIn();
    })
    .catch(() => undefined);
  const timer = setInterval(() => {
    letIn();
    if (navigator.onLine) void registration?.update().catch(() => undefined);
  }, 60_000);
  const unsubscribe = round.subscribe(letIn);
  return () => {
    stopped = true;
    clearInterval(timer);
    unsubscribe();
    navigator.serviceWorker.removeEventListener('controllerchange', onChanged);
  };
}
