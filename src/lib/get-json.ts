import { REQUEST_WORDS } from './words';
/** A read that was refused or did not arrive, in words for people. */
export class ReadProblem extends Error {}

/** A read of the app's own JSON. Throws a ReadProblem with the server's plain message. */
export async function getJson<T>(url: string, signal?: AbortSignal): Promise<T> {
  const response = await fetch(url, { headers: { accept: 'application/json' }, signal: signal ?? null }).catch(
    (error: unknown) => {
      if (signal?.aborted) throw error;
      throw new ReadProblem(REQUEST_WORDS.maybeOld);
    },
  );
  if (response.ok) {
    const body: T = await response.json();
    return body;
  }
  const answer: { error?: { message?: string } } = await response.json().catch(() => ({}));
  throw new ReadProblem(answer.error?.message ?? REQUEST_WORDS.maybeOld);
}
