import type { ReactNode } from 'react';
import { joinClasses } from './join-classes';
import type { Light } from './light';
import { LightSwitch } from './light-switch';
import { Link } from './link';
import { SkipLink } from './skip-link';
import { Wordmark } from './wordmark';
import { SHELL_WORDS } from './words/shell';

export interface PlainShellProps {
  light: Light;
  home?: string;
  /** `form` for sign-in and the like, `page` for reading. */
  width?: 'form' | 'page';
  /** Links at the head's right. */
  links?: ReactNode;
  children: ReactNode;
}

/** Frame of pages without a club: sign in, join, a public page, a safety contact's page. */
export function PlainShell({ light, home = '/', width = 'form', links, children }: PlainShellProps) {
  const room = width === 'form' ? 'max-w-lg' : 'max-w-4xl';
  return (
    <div className="flex min-h-dvh flex-col">
      <SkipLink />
      <header className={joinClasses('mx-auto flex w-full items-center justify-between gap-4 px-5 pt-6 pb-4', room)}>
        <Link href={home} className="rounded-sm no-underline" aria-label={SHELL_WORDS.home}>
          <Wordmark className="text-2xl" />
        </Link>
        <div className="flex items-center gap-2">
          {links}
          <LightSwitch light={light} />
        </div>
      </header>
      <main id="main" tabIndex={-1} className={joinClasses('mx-auto w-full flex-1 px-5 py-6 focus:outline-none', room)}>
        {children}
      </main>
    </div>
  );
}
