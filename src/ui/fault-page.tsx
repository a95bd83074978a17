import { FAULT_PAGE_WORDS as WORDS } from './words/fault';

export interface FaultPageProps {
  error: Error & { digest?: string };
  reset: () => void;
}

const BUTTON = 'inline-flex min-h-11 items-center rounded-sm border border-rule-strong px-4 font-semibold no-underline';

/** In place of a page that threw. Every page carries it, so it leans on nothing; its link loads the page anew. */
export function FaultPage({ error, reset }: FaultPageProps) {
  return (
    <main id="main" className="mx-auto w-full max-w-lg px-5 py-10">
      <h1 className="sr-only">{WORDS.heading}</h1>
      <div role="alert" className="border-2 border-clay bg-panel px-4 py-5">
        <p className="font-serif text-lg">{WORDS.title}</p>
        <p className="mt-1">{WORDS.text}</p>
        {error.digest && <p className="mt-2 text-ink-soft text-sm">{WORDS.reference(error.digest)}</p>}
        <div className="mt-4 flex flex-wrap gap-2">
          <button type="button" className={BUTTON} onClick={reset}>
            {WORDS.again}
          </button>
          <a href="/" className={BUTTON}>
            {WORDS.first}
          </a>
        </div>
      </div>
    </main>
  );
}
