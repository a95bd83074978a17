import type { Metadata } from 'next';
import { cookies } from 'next/headers';
import { notFound } from 'next/navigation';
import { env } from '@/env';
import { AppShell } from '@/ui/app-shell';
import { LIGHT_COOKIE, parseLight } from '@/ui/light';
import { Badge, PageTitle } from '@/ui/page-parts';
import { BoardSign, GroundSign, LogSign, PeopleSign, SeatSign, TreeSign, WeekSign } from '@/ui/page-signs';
import { LIGHT_NAMES } from '@/ui/words/shell';
import { ShowForms } from './show-forms';
import { ShowParts } from './show-parts';
import { ShowWind } from './show-wind';

export const metadata: Metadata = { title: 'Parts of the look' };

const ITEMS = [
  { href: '/dev/ui', label: 'Sit', icon: <SeatSign /> },
  { href: '/dev/ui/week', label: 'Week', icon: <WeekSign /> },
  { href: '/dev/ui/board', label: 'Board', icon: <BoardSign /> },
  { href: '/dev/ui/ground', label: 'Ground', icon: <GroundSign /> },
  { href: '/dev/ui/stands', label: 'Stands', icon: <TreeSign /> },
  { href: '/dev/ui/log', label: 'Log', icon: <LogSign /> },
  { href: '/dev/ui/club', label: 'Club', icon: <PeopleSign /> },
];

const SHOWN = ['day', 'dark', 'dim'] as const;

export default async function PartsPage() {
  if (!env.devPages) notFound();
  const light = parseLight((await cookies()).get(LIGHT_COOKIE)?.value);
  return (
    <AppShell
      items={ITEMS}
      home="/dev/ui"
      light={light}
      club={<p className="truncate font-semibold">Spring Hollow</p>}
      offlineMark={<Badge look="strong">No signal</Badge>}
    >
      <PageTitle
        over="For those who build the screens"
        title="Parts of the look"
        lead="Every part in day, dark and dim. Page parts with no ground of their own take the light around them."
      />
      {SHOWN.map((one) => (
        <div key={one} data-light={one} className="-mx-4 px-4 py-8 sm:-mx-8 sm:px-8">
          <h2 className="mb-6 font-serif text-2xl">{LIGHT_NAMES[one]}</h2>
          <ShowWind />
          <ShowForms tag={one} />
          <ShowParts />
        </div>
      ))}
    </AppShell>
  );
}
