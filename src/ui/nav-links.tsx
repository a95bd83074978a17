'use client';

import { usePathname } from 'next/navigation';
import type { ReactNode } from 'react';
import { findCurrent } from './current-path';
import { joinClasses } from './join-classes';
import { LazyPart, makeLazy } from './lazy-part';
import { Link } from './link';
import type { MoreSheetProps } from './more-sheet';
import { PagesSign } from './signs';
import { MORE_WORDS } from './words/shell';

export interface NavItem {
  href: string;
  label: string;
  /** A sign of 24 px, drawn on the phone's bar. */
  icon: ReactNode;
}

function useCurrent(items: readonly NavItem[]): string | null {
  const hrefs = items.map((item) => item.href);
  return findCurrent(usePathname(), hrefs);
}

/** The side rail's list of pages, as a table of contents. */
export function RailLinks({ items }: { items: readonly NavItem[] }) {
  const current = useCurrent(items);
  return (
    <ul className="divide-y divide-rule border-rule border-y">
      {items.map((item) => (
        <li key={item.href}>
          <Link
            href={item.href}
            aria-current={item.href === current ? 'page' : undefined}
            className="group flex min-h-9 items-center gap-2 py-0.5 pl-2 font-serif no-underline hover:bg-sunk aria-[current=page]:font-semibold"
          >
            <span
              aria-hidden="true"
              className="h-1 w-0 bg-moss transition-[width] duration-150 group-aria-[current=page]:w-5"
            />
            {item.label}
          </Link>
        </li>
      ))}
    </ul>
  );
}

const CELL =
  'flex min-h-14 w-full flex-col items-center justify-center gap-0.5 border-transparent border-t-3 px-1 pb-1 text-ink-soft text-xs no-underline aria-[current=page]:border-moss aria-[current=page]:font-semibold aria-[current=page]:text-ink';

const lazyMore = makeLazy<MoreSheetProps>(() => import('./more-sheet').then((parts) => parts.MoreSheet));

export interface BottomBarProps {
  items: readonly NavItem[];
  /** How many stand on the bar; the rest go under More. */
  onBar?: number;
  /** Foot of the More sheet: light switch, account. */
  foot?: ReactNode;
}

export function BottomBar({ items, onBar = 4, foot }: BottomBarProps) {
  const current = useCurrent(items);
  const first = items.slice(0, onBar);
  const rest = items.slice(onBar);
  const inRest = rest.some((item) => item.href === current);
  const triggerClass = joinClasses(CELL, inRest && 'border-moss! text-ink');
  return (
    <ul className="grid auto-cols-fr grid-flow-col">
      {first.map((item) => (
        <li key={item.href}>
          <Link href={item.href} aria-current={item.href === current ? 'page' : undefined} className={CELL}>
            <span aria-hidden="true">{item.icon}</span>
            {item.label}
          </Link>
        </li>
      ))}
      {(rest.length > 0 || foot) && (
        <li>
          <LazyPart
            of={lazyMore}
            part={{ items: rest, current, foot, triggerClass }}
            closed={({ ahead, open }) => (
              <button type="button" {...ahead} aria-haspopup="dialog" className={triggerClass} onClick={open}>
                <PagesSign />
                {MORE_WORDS.more}
              </button>
            )}
          />
        </li>
      )}
    </ul>
  );
}
