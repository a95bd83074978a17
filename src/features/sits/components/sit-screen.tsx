'use client';

import { useEffect, useState } from 'react';
import { formatDay } from '@/core/day-time';
import { Button, ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { useRead } from '@/ui/query';
import type { SitsAskText } from '../ask-schema';
import type { BookActions, Hunter } from '../book-actions';
import { sitsQuery } from '../queries';
import type { OpenRow, SitsView } from '../view-types';
import { WINDOW_WORDS } from '../words';
import { BackToWindow } from './back-to-window';
import { BlockedList } from './blocked-list';
import { ForecastNote } from './forecast-note';
import { LazyBookDialog } from './load-parts';
import { SitHead } from './sit-head';
import { SitRow } from './sit-row';

export interface SitScreenProps {
  ask: SitsAskText;
  initial: SitsView;
  /** Row open at first. */
  openStandId: string | null;
  actions: BookActions;
  /** Members an admin may book for; null: only oneself. */
  hunters: Hunter[] | null;
  may: { book: boolean; addStands: boolean };
  /** The address names no window: the next one is shown. */
  isNext: boolean;
}

export function SitScreen({ ask, initial, openStandId, actions, hunters, may, isNext }: SitScreenProps) {
  const { slug } = initial.club;
  const query = useRead({ ...sitsQuery(slug, ask), initialData: initial, initialDataUpdatedAt: initial.madeAt });
  const view = query.data;
  const [openId, setOpenId] = useState(openStandId);
  const [booking, setBooking] = useState<OpenRow | null>(null);
  const { window, mine } = view;
  useEffect(() => {
    if (openStandId) document.getElementById(openStandId)?.scrollIntoView({ block: 'start' });
  }, [openStandId]);
  return (
    <>
      <PageTitle
        over={<span className="max-sm:hidden">{view.club.name}</span>}
        title={`${formatDay(window.day)}, ${WINDOW_WORDS[window.window]}`}
        actions={
          <ButtonLink look="quiet" className="max-sm:hidden" href={`/clubs/${slug}/week`}>
            The whole week
          </ButtonLink>
        }
      />
      <SitHead view={view} />
      <div className="mt-3 grid gap-3">
        <BackToWindow view={view} isNext={isNext} />
        <ForecastNote forecast={view.forecast} now={view.madeAt} />
        {query.isError && (
          <Notice
            level="caution"
            title="This list may be old"
            actions={<Button onClick={() => query.refetch()}>Try again</Button>}
          >
            {query.error.message}
          </Notice>
        )}
        {view.cautions.map((caution) => (
          <Notice key={caution.text} level={caution.level === 'stop' ? 'stop' : 'caution'} title={caution.text} />
        ))}
        {view.over && <Notice title="This window is over">The list shows how it stood.</Notice>}
        {mine && (
          <Notice
            title={`You sit at ${mine.standName}, ${mine.windows === 'all_day' ? 'all day' : mine.windows}`}
            actions={<ButtonLink href={`/clubs/${slug}/my-sits`}>Change or cancel it</ButtonLink>}
          >
            {!view.over && 'Or move to another stand below.'}
          </Notice>
        )}
      </div>
      <RankedList
        view={view}
        ask={ask}
        openId={openId}
        onToggle={(id) => setOpenId(openId === id ? null : id)}
        onBook={may.book && !view.over ? setBooking : null}
        addStands={may.addStands}
      />
      <BlockedList rows={view.blocked} />
      {booking && (
        <LazyBookDialog
          key={booking.standId}
          row={booking}
          view={view}
          actions={actions}
          hunters={hunters}
          onClose={() => setBooking(null)}
        />
      )}
    </>
  );
}

interface RankedListProps {
  view: SitsView;
  ask: SitsAskText;
  openId: string | null;
  onToggle: (standId: string) => void;
  onBook: ((row: OpenRow) => void) | null;
  addStands: boolean;
}

function RankedList({ view, ask, openId, onToggle, onBook, addStands }: RankedListProps) {
  if (view.standCount === 0) {
    return (
      <div className="mt-6">
        <EmptyState
          title="No stands yet"
          action={
            addStands && (
              <ButtonLink look="primary" href={`/clubs/${view.club.slug}/stands/new`}>
                Add the first stand
              </ButtonLink>
            )
          }
        >
          {addStands ? 'A stand with its good winds is all a first list needs.' : 'A steward of the club adds them.'}
        </EmptyState>
      </div>
    );
  }
  return (
    <section aria-labelledby="ranked" className="mt-4 sm:mt-6">
      <h2 id="ranked" className="sr-only">
        Stands by sit score
      </h2>
      {view.open.length === 0 ? (
        <EmptyState title="No stand is open in this window">
          Each one below names the rule that stops it. Try the next window or another weapon.
        </EmptyState>
      ) : (
        <ol className="border-rule-strong border-t">
          {view.open.map((row) => (
            <SitRow
              key={row.standId}
              row={row}
              view={view}
              ask={ask}
              open={openId === row.standId}
              onToggle={() => onToggle(row.standId)}
              onBook={onBook && (() => onBook(row))}
            />
          ))}
        </ol>
      )}
    </section>
  );
}
