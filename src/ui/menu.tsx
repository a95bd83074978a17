'use client';

import type { ReactNode } from 'react';
import { Button, type ButtonLook } from './button';
import { LazyPart, makeLazy } from './lazy-part';
import { DownSign } from './signs';

export interface MenuItem {
  label: ReactNode;
  /** Leads to a page; or give `onSelect`. */
  href?: string;
  onSelect?: () => void;
  danger?: boolean;
  disabled?: boolean;
  /** Marks the one in use, as the club now shown. */
  current?: boolean;
}

export interface MenuProps {
  label: ReactNode;
  /** Name for a screen reader when the label is only a sign. */
  name?: string;
  items: readonly MenuItem[];
  look?: ButtonLook;
  align?: 'start' | 'end';
  className?: string;
}

const lazyMenu = makeLazy<MenuProps>(() => import('./open-menu').then((parts) => parts.OpenMenu));

/** A button that opens a list of places to go or things to do. */
export function Menu(props: MenuProps) {
  const { label, name, look = 'plain', className } = props;
  return (
    <LazyPart
      of={lazyMenu}
      part={props}
      closed={({ ahead, open }) => (
        <Button
          {...ahead}
          look={look}
          aria-label={name}
          aria-haspopup="menu"
          aria-expanded={false}
          className={className}
          onClick={open}
          onKeyDown={(event) => event.key === 'ArrowDown' && open()}
        >
          {label}
          <DownSign className="size-4 shrink-0" />
        </Button>
      )}
    />
  );
}
