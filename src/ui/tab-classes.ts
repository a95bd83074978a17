export const TAB_LIST_CLASSES = 'flex gap-x-5 overflow-x-auto border-rule-strong border-b';

export const TAB_CLASSES =
  '-mb-px min-h-11 shrink-0 border-transparent border-b-[3px] px-0.5 py-2 text-ink-soft no-underline hover:text-ink data-[state=active]:border-moss data-[state=active]:font-semibold data-[state=active]:text-ink aria-[current=page]:border-moss aria-[current=page]:font-semibold aria-[current=page]:text-ink focus-visible:-outline-offset-2';
