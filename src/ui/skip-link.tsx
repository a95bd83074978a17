import { SHELL_WORDS } from './words/shell';

/** First stop of the Tab key on every page. */
export function SkipLink() {
  return (
    <a
      href="#main"
      className="fixed top-2 left-2 z-50 -translate-y-20 border-2 border-moss bg-panel px-4 py-2.5 font-semibold focus:translate-y-0 print:hidden"
    >
      {SHELL_WORDS.skip}
    </a>
  );
}
