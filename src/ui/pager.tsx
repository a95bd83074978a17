import { Button, ButtonLink } from './button';
import { PAGER_WORDS } from './words/tables';

export interface PagerProps {
  /** From 1. */
  page: number;
  pages: number;
  /** Addresses of pages; or give `onPage`. */
  hrefFor?: (page: number) => string;
  onPage?: (page: number) => void;
  /** As 'Stands 26-50 of 61'. */
  summary?: string;
}

export function Pager({ page, pages, hrefFor, onPage, summary }: PagerProps) {
  if (pages <= 1 && !summary) return null;
  return (
    <nav
      aria-label={PAGER_WORDS.more}
      className="flex flex-wrap items-center justify-between gap-3 border-rule border-t pt-3"
    >
      <p className="text-ink-soft text-sm">{summary ?? PAGER_WORDS.page(page, pages)}</p>
      {pages > 1 && (
        <div className="flex gap-2">
          <Step to={page - 1} label={PAGER_WORDS.previous} stop={page <= 1} hrefFor={hrefFor} onPage={onPage} />
          <Step to={page + 1} label={PAGER_WORDS.next} stop={page >= pages} hrefFor={hrefFor} onPage={onPage} />
        </div>
      )}
    </nav>
  );
}

interface StepProps extends Pick<PagerProps, 'hrefFor' | 'onPage'> {
  to: number;
  label: string;
  stop: boolean;
}

function Step({ to, label, stop, hrefFor, onPage }: StepProps) {
  if (hrefFor && !stop) return <ButtonLink href={hrefFor(to)}>{label}</ButtonLink>;
  return (
    <Button disabled={stop} onClick={onPage && (() => onPage(to))}>
      {label}
    </Button>
  );
}
