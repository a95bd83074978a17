const SOONEST_MS = 15_000;
const LATEST_MS = 5 * 60_000;

/**
 * When to ask again, ms: every quarter minute while all is well; while the server does not answer, after as long again as
 * it has been silent, so that waits double, up to five minutes.
 */
export function pollAfterMs(state: { failing: boolean; lastAnswerAt: number; now: number }): number {
  if (!state.failing) return SOONEST_MS;
  return Math.min(LATEST_MS, Math.max(SOONEST_MS, state.now - state.lastAnswerAt));
}
