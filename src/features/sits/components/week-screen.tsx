'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button, ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { useRead } from '@/ui/query';
import { Select } from '@/ui/text-inputs';
import type { WeekAskText } from '../ask-schema';
import { weekQuery } from '../queries';
import type { WeekView } from '../view-types';
import { WEEK_SHOW_LABELS, WEEK_SHOWS, type WeekShow } from '../week-cells';
import { WEAPON_LABELS } from '../words';
import { ForecastNote } from './forecast-note';
import { WeekDays } from './week-days';
import { WeekTable } from './week-table';

export function WeekScreen({ ask, initial }: { ask: WeekAskText; initial: WeekView }) {
  const { slug } = initial.club;
  const router = useRouter();
  const query = useRead({ ...weekQuery(slug, ask), initialData: initial, initialDataUpdatedAt: initial.madeAt });
  const view = query.data ?? initial;
  const [show, setShow] = useState<WeekShow>('all');
  return (
    <>
      <PageTitle
        over={<span className="max-sm:hidden">{view.club.name}</span>}
        title="Week"
        lead="Every stand in every window the forecast reaches."
        actions={
          <ButtonLink look="quiet" href={`/clubs/${slug}/sit`}>
            The next window
          </ButtonLink>
        }
      />
      <div className="grid grid-cols-2 items-end gap-3 sm:flex sm:gap-6 print:hidden">
        <Select
          label="Show"
          value={show}
          onChange={({ target }) => setShow(WEEK_SHOWS.find((one) => one === target.value) ?? 'all')}
          options={WEEK_SHOWS.map((value) => ({ value, label: WEEK_SHOW_LABELS[value] }))}
        />
        <Select
          key={view.weapon}
          label="Weapon"
          defaultValue={view.weapon ?? ''}
          onChange={({ target }) => router.push(`/clubs/${slug}/week${target.value ? `?weapon=${target.value}` : ''}`)}
          options={[
            { value: '', label: 'Any weapon' },
            ...view.weapons.map((value) => ({ value, label: WEAPON_LABELS[value] })),
          ]}
        />
      </div>
      <div className="mt-3 grid gap-3">
        <ForecastNote forecast={view.forecast} now={view.madeAt} />
        {query.isError && (
          <Notice
            level="caution"
            title="This week may be old"
            actions={<Button onClick={() => query.refetch()}>Try again</Button>}
          >
            {query.error.message}
          </Notice>
        )}
        {view.cautions.map((caution) => (
          <Notice key={caution.text} level="caution" title={caution.text} />
        ))}
      </div>
      {view.stands.length === 0 ? (
        <div className="mt-6">
          <EmptyState title="No stands yet">The week fills itself once the club has stands.</EmptyState>
        </div>
      ) : (
        <>
          <div className="mt-6 sm:hidden print:hidden">
            <WeekDays view={view} show={show} />
          </div>
          <section
            aria-label="Stands and windows"
            className="relative mt-6 hidden overflow-x-auto pb-3 sm:block print:block print:overflow-visible"
          >
            <WeekTable view={view} show={show} />
          </section>
          <p className="mt-2 hidden text-ink-soft text-sm sm:block">
            Beside the word stands the sit score. The strip is the compass from north to north: shading is where the
            wind is expected from, the bar the stand's good arcs.
          </p>
        </>
      )}
    </>
  );
}
