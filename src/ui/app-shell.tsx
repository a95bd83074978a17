import type { ReactNode } from 'react';
import { KeyboardMap } from './keyboard-map';
import type { Light } from './light';
import { LightSwitch } from './light-switch';
import { Link } from './link';
import { BottomBar, type NavItem, RailLinks } from './nav-links';
import { SkipLink } from './skip-link';
import { Wordmark } from './wordmark';
import { SHELL_WORDS } from './words/shell';

export interface AppShellProps {
  items: readonly NavItem[];
  /** Where the wordmark leads. */
  home: string;
  light: Light;
  /** Club's name or a Menu of clubs. Drawn twice, for rail and phone: keep no ids in it. */
  club?: ReactNode;
  /** The person's own menu: profile, sign out. */
  account?: ReactNode;
  /** Shown when there is no signal or what is shown is old. */
  offlineMark?: ReactNode;
  children: ReactNode;
}

/** Frame of every club page: a bar at the foot of a phone, a rail at the side of a desk. */
export function AppShell({ items, home, light, club, account, offlineMark, children }: AppShellProps) {
  return (
    <div className="min-h-dvh md:grid md:grid-cols-[14rem_minmax(0,1fr)] print:block">
      <SkipLink />
      <header className="sticky top-0 hidden h-dvh flex-col gap-3 overflow-y-auto border-rule border-r px-5 py-4 md:flex print:hidden">
        <Link href={home} className="self-start rounded-sm no-underline" aria-label={SHELL_WORDS.home}>
          <Wordmark className="text-2xl" />
        </Link>
        {club}
        <nav aria-label={SHELL_WORDS.pages}>
          <RailLinks items={items} />
        </nav>
        <div className="mt-auto flex flex-col items-start gap-1">
          {offlineMark}
          <div className="flex flex-wrap gap-x-2">
            <KeyboardMap items={items.map(({ href, label }) => ({ href, label }))} />
            <LightSwitch light={light} />
          </div>
          {account}
        </div>
      </header>

      <div className="flex min-w-0 flex-col">
        <header className="flex min-h-14 items-center justify-between gap-3 border-rule border-b px-4 py-1.5 md:hidden print:hidden">
          <Link href={home} className="rounded-sm py-2 no-underline" aria-label={SHELL_WORDS.home}>
            <Wordmark className="text-xl" />
          </Link>
          <div className="flex min-w-0 items-center gap-2">
            {offlineMark}
            {club}
          </div>
        </header>
        <main
          id="main"
          tabIndex={-1}
          className="mx-auto w-full max-w-6xl flex-1 px-4 py-5 pb-28 focus:outline-none sm:px-8 sm:py-8 md:pb-16 print:p-0"
        >
          {children}
        </main>
      </div>

      <nav
        aria-label={SHELL_WORDS.pages}
        className="fixed inset-x-0 bottom-0 z-30 border-rule-strong border-t bg-paper foot-room md:hidden print:hidden"
      >
        <BottomBar
          items={items}
          foot={
            <>
              <LightSwitch light={light} />
              {account}
            </>
          }
        />
      </nav>
    </div>
  );
}
