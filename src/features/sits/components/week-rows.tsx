'use client';

import { useRouter } from 'next/navigation';
import { Activity, type ChangeEvent, type ReactNode, useState } from 'react';
import { askText } from '../read-addresses';
import type { WeekView } from '../view-types';
import { WEEK_SHOWS, type WeekShow } from '../week-cells';
import { WEEK_TABLE_WORDS } from '../words/week';
import { WeekDays } from './week-days';
import { WeekTable } from './week-table';

interface WeekRowsProps {
  view: WeekView;
  /** The fields of the form, drawn by the server. */
  choices: ReactNode;
  /** Notes between the form and the rows. */
  children: ReactNode;
}

/** The week as a table, and on a phone as a list by day. */
export function WeekRows({ view, choices, children }: WeekRowsProps) {
  const router = useRouter();
  const [show, setShow] = useState<WeekShow>('all');
  const action = `/clubs/${view.club.slug}/week`;

  function choose({ target }: ChangeEvent<HTMLFormElement>) {
    const field: EventTarget = target;
    if (!(field instanceof HTMLSelectElement)) return;
    if (field.name === 'show') return setShow(WEEK_SHOWS.find((one) => one === field.value) ?? 'all');
    const asked = askText({ weapon: field.value });
    router.push(asked ? `${action}?${asked}` : action);
  }

  return (
    <>
      <form
        method="get"
        action={action}
        onChange={choose}
        className="grid grid-cols-2 items-end gap-3 sm:flex sm:gap-6 print:hidden"
      >
        {choices}
      </form>
      <div className="mt-3 grid gap-3">{children}</div>
      {view.stands.length > 0 && (
        <>
          {/* Each an activity of its own: the browser makes them live one by one, and answers a press in between. */}
          <Activity>
            <div className="mt-6 sm:hidden print:hidden">
              <WeekDays view={view} show={show} />
            </div>
          </Activity>
          <Activity>
            <section
              aria-label={WEEK_TABLE_WORDS.region}
              className="relative mt-6 hidden overflow-x-auto pb-3 sm:block print:block print:overflow-visible"
            >
              <WeekTable view={view} show={show} />
            </section>
          </Activity>
          <p className="mt-2 hidden text-ink-soft text-sm sm:block">{WEEK_TABLE_WORDS.legend}</p>
        </>
      )}
    </>
  );
}
