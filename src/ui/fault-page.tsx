import { buttonClasses } from './button-classes';
import { ErrorState } from './error-state';
import { FAULT_PAGE_WORDS } from './words';

export interface FaultPageProps {
  error: Error & { digest?: string };
  reset: () => void;
}

/** In place of a page that threw. Every page carries it, so it leans on little; its link loads the page anew. */
export function FaultPage({ error, reset }: FaultPageProps) {
  return (
    <main id="main" className="mx-auto w-full max-w-lg px-5 py-10">
      <h1 className="sr-only">{FAULT_PAGE_WORDS.heading}</h1>
      <ErrorState
        title={FAULT_PAGE_WORDS.title}
        reference={error.digest}
        action={
          <>
            <button type="button" className={buttonClasses('primary')} onClick={reset}>
              {FAULT_PAGE_WORDS.again}
            </button>
            <a href="/" className={buttonClasses()}>
              {FAULT_PAGE_WORDS.first}
            </a>
          </>
        }
      >
        {FAULT_PAGE_WORDS.text}
      </ErrorState>
    </main>
  );
}
