import { type ReactNode, useId } from 'react';
import { joinClasses } from './join-classes';

export { Badge, type BadgeLook } from './badge';

export interface PageTitleProps {
  title: ReactNode;
  /** Small line above: the club, the day. */
  over?: ReactNode;
  /** A sentence below. */
  lead?: ReactNode;
  actions?: ReactNode;
}

/** The page's one h1. */
export function PageTitle({ title, over, lead, actions }: PageTitleProps) {
  return (
    <header className="double-rule mb-6 flex flex-wrap items-end justify-between gap-x-6 gap-y-3 pb-3">
      <div className="min-w-0">
        {over && <p className="text-ink-soft">{over}</p>}
        <h1 className="font-serif text-2xl sm:text-3xl">{title}</h1>
        {lead && <p className="mt-1.5 max-w-prose text-ink-soft">{lead}</p>}
      </div>
      {actions && <div className="flex flex-wrap items-center gap-2 print:hidden">{actions}</div>}
    </header>
  );
}

export interface SectionProps {
  title: ReactNode;
  note?: ReactNode;
  actions?: ReactNode;
  /** `margin` hangs the heading beside the text on wide screens: good for forms and long reading. */
  heading?: 'above' | 'margin';
  level?: 2 | 3;
  id?: string;
  className?: string;
  children: ReactNode;
}

export function Section(props: SectionProps) {
  const { title, note, actions, heading = 'above', level = 2, id, className, children } = props;
  const ownId = useId();
  const headingId = `${id ?? ownId}-title`;
  const Heading = level === 2 ? 'h2' : 'h3';
  return (
    <section
      id={id}
      aria-labelledby={headingId}
      className={joinClasses(
        'mt-8 border-rule-strong border-t pt-3 first:mt-0',
        heading === 'margin' && 'lg:grid lg:grid-cols-[13rem_minmax(0,1fr)] lg:gap-8',
        className,
      )}
    >
      <div className="mb-3 flex break-after-avoid flex-wrap items-start justify-between gap-x-4 gap-y-2">
        <div>
          <Heading id={headingId} className={joinClasses('font-serif', level === 2 ? 'text-xl' : 'text-lg')}>
            {title}
          </Heading>
          {note && <p className="mt-1 max-w-prose text-ink-soft text-sm">{note}</p>}
        </div>
        {actions && <div className="flex flex-wrap gap-2">{actions}</div>}
      </div>
      <div className="min-w-0">{children}</div>
    </section>
  );
}

/** A sheet laid on the page: for one thing among several of its kind. */
export function Card({ className, children }: { className?: string; children: ReactNode }) {
  return <div className={joinClasses('border border-rule bg-panel p-4', className)}>{children}</div>;
}

export interface Definition {
  term: ReactNode;
  detail: ReactNode;
}

export function DefinitionList({ items, className }: { items: Definition[]; className?: string }) {
  return (
    <dl className={joinClasses('divide-y divide-rule border-rule border-y', className)}>
      {items.map((item, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: terms may be any node and the list is drawn whole
        <div key={index} className="grid grid-cols-[minmax(7rem,34%)_1fr] gap-4 py-1.5">
          <dt className="text-ink-soft">{item.term}</dt>
          <dd className="min-w-0">{item.detail}</dd>
        </div>
      ))}
    </dl>
  );
}
