'use client';

import { usePathname } from 'next/navigation';
import { findCurrent } from '@/ui/current-path';
import { TabLinks } from '@/ui/tab-links';

interface ClubTabsProps {
  label: string;
  items: { href: string; label: string }[];
}

/** Pages that belong together, such as those about the club itself. */
export function ClubTabs({ label, items }: ClubTabsProps) {
  const current = findCurrent(
    usePathname(),
    items.map((item) => item.href),
  );
  return (
    <div className="mb-6 print:hidden">
      <TabLinks label={label} items={items.map((item) => ({ ...item, current: item.href === current }))} />
    </div>
  );
}
