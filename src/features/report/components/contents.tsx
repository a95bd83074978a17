import { PART_TITLES, REPORT_PAGE_WORDS as words } from '../words/page';

type Part = keyof typeof PART_TITLES;

/** Leads to each part of a long page. */
export function Contents({ parts }: { parts: Part[] }) {
  return (
    <nav aria-label={words.contents} className="mt-6 print:hidden">
      <ul className="flex flex-wrap gap-x-5">
        {parts.map((part) => (
          <li key={part}>
            <a
              href={`#${part}`}
              className="inline-flex min-h-11 items-center underline decoration-rule-strong underline-offset-4 hover:decoration-2"
            >
              {PART_TITLES[part]}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}
