import type { ReactNode } from 'react';
import { Link } from './link';
import { TAB_CLASSES, TAB_LIST_CLASSES } from './tab-classes';

export interface TabLinksProps {
  label: string;
  items: readonly { href: string; label: ReactNode; current?: boolean }[];
}

/** Pages that lie beside each other, as morning and evening. */
export function TabLinks({ label, items }: TabLinksProps) {
  return (
    <nav aria-label={label} className={TAB_LIST_CLASSES}>
      {items.map((item) => (
        <Link
          key={item.href}
          href={item.href}
          aria-current={item.current ? 'page' : undefined}
          className={`inline-block ${TAB_CLASSES}`}
        >
          {item.label}
        </Link>
      ))}
    </nav>
  );
}
