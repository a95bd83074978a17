import { joinClasses } from './join-classes';

export type ButtonLook = 'primary' | 'plain' | 'danger' | 'quiet';

const BASE =
  'inline-flex min-h-11 min-w-11 items-center justify-center gap-2 rounded-sm py-2 text-center font-semibold leading-tight no-underline transition-colors duration-150 ease-page disabled:opacity-60 aria-disabled:opacity-60';

const LOOKS: Record<ButtonLook, string> = {
  primary: 'border border-moss px-4 bg-moss-fill text-on-moss hover:bg-moss-fill/90 active:bg-moss-fill/80',
  plain: 'border border-rule-strong px-4 bg-panel text-ink hover:border-ink hover:bg-sunk',
  danger: 'border border-clay px-4 bg-clay-fill text-on-clay hover:bg-clay-fill/90 active:bg-clay-fill/80',
  quiet: 'border border-transparent px-2 text-ink underline decoration-rule-strong underline-offset-4 hover:bg-sunk',
};

export function buttonClasses(look: ButtonLook = 'plain', className?: string): string {
  return joinClasses(BASE, LOOKS[look], className);
}
