/** Runs once the browser has nothing more urgent to do; gives what calls it off. */
export function whenIdle(run: () => void): () => void {
  if ('requestIdleCallback' in window) {
    const asked = window.requestIdleCallback(run, { timeout: 2000 });
    return () => window.cancelIdleCallback(asked);
  }
  // Safari has no such call.
  const timer = setTimeout(run, 200);
  return () => clearTimeout(timer);
}
