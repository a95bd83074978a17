'use client';

import * as Dropdown from 'radix-ui/dropdown-menu';
import { Button } from './button';
import { joinClasses } from './join-classes';
import { Link } from './link';
import type { MenuItem, MenuProps } from './menu';
import { DownSign } from './signs';

const ITEM_CLASSES =
  'flex min-h-11 w-full items-center gap-3 px-4 py-2 no-underline outline-none data-highlighted:bg-sunk data-disabled:text-ink-soft';

export const MENU_CLASSES =
  'z-50 max-h-[70dvh] min-w-52 overflow-y-auto border border-rule-strong bg-panel py-1 text-ink';

/** The menu itself, open as soon as it is there: see Menu. */
export function OpenMenu({ label, name, items, look = 'plain', align = 'start', className }: MenuProps) {
  return (
    <Dropdown.Root modal={false} defaultOpen>
      <Dropdown.Trigger asChild>
        <Button look={look} aria-label={name} className={className}>
          {label}
          <DownSign className="size-4 shrink-0" />
        </Button>
      </Dropdown.Trigger>
      <Dropdown.Portal>
        <Dropdown.Content align={align} sideOffset={4} collisionPadding={8} className={MENU_CLASSES}>
          {items.map((item, index) => (
            <MenuRow
              // biome-ignore lint/suspicious/noArrayIndexKey: labels may be any node and the list is drawn whole
              key={index}
              item={item}
            />
          ))}
        </Dropdown.Content>
      </Dropdown.Portal>
    </Dropdown.Root>
  );
}

function MenuRow({ item }: { item: MenuItem }) {
  const classes = joinClasses(ITEM_CLASSES, item.danger && 'text-clay', item.current && 'font-semibold');
  if (item.href) {
    return (
      <Dropdown.Item asChild disabled={item.disabled}>
        <Link href={item.href} aria-current={item.current ? 'true' : undefined} className={classes}>
          {item.label}
        </Link>
      </Dropdown.Item>
    );
  }
  return (
    <Dropdown.Item disabled={item.disabled} onSelect={item.onSelect} className={joinClasses(classes, 'cursor-pointer')}>
      {item.label}
    </Dropdown.Item>
  );
}
