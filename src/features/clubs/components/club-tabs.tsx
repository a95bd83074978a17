'use client';

import { usePathname } from 'next/navigation';
import { findCurrent } from '@/ui/current-path';
import { TabLinks } from '@/ui/tab-links';

/** Pages about the club itself; the first is the parent of the others. */
export function ClubTabs({ items }: { items: { href: string; label: string }[] }) {
  const current = findCurrent(
    usePathname(),
    items.map((item) => item.href),
  );
  return (
    <div className="mb-6 print:hidden">
      <TabLinks label="About the club" items={items.map((item) => ({ ...item, current: item.href === current }))} />
    </div>
  );
}
