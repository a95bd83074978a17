'use client';

import { type ReactNode, useState } from 'react';
import { Dialog } from './dialog';
import { Link } from './link';
import type { NavItem } from './nav-links';
import { PagesSign } from './signs';
import { MORE_WORDS } from './words/shell';

export interface MoreSheetProps {
  items: readonly NavItem[];
  current: string | null;
  foot?: ReactNode;
  triggerClass: string;
}

/** Pages that have no room on a phone's bar, and what stands under the rail of a desk; open as soon as it is there. */
export function MoreSheet({ items, current, foot, triggerClass }: MoreSheetProps) {
  const [open, setOpen] = useState(true);
  return (
    <Dialog
      title={MORE_WORDS.more}
      open={open}
      onOpenChange={setOpen}
      trigger={
        <button type="button" className={triggerClass}>
          <PagesSign />
          {MORE_WORDS.more}
        </button>
      }
    >
      <nav aria-label={MORE_WORDS.morePages}>
        <ul className="divide-y divide-rule">
          {items.map((item) => (
            <li key={item.href}>
              <Link
                href={item.href}
                onClick={() => setOpen(false)}
                aria-current={item.href === current ? 'page' : undefined}
                className="flex min-h-12 items-center gap-3 font-serif text-lg no-underline aria-[current=page]:font-semibold"
              >
                <span aria-hidden="true" className="text-ink-soft">
                  {item.icon}
                </span>
                {item.label}
              </Link>
            </li>
          ))}
        </ul>
      </nav>
      {foot && (
        <div className="mt-3 flex flex-wrap items-center justify-between gap-2 border-rule-strong border-t pt-3">
          {foot}
        </div>
      )}
    </Dialog>
  );
}
