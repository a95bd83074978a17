import { SHELL_WORDS } from './words/shell';

/** First stop of the Tab key on every page; not there at all until it has the focus, wherever the page is scrolled or pulled. */
export function SkipLink() {
  return (
    <a
      href="#main"
      className="sr-only z-50 border-2 border-moss bg-panel font-semibold focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:px-4 focus:py-2.5 print:hidden"
    >
      {SHELL_WORDS.skip}
    </a>
  );
}
