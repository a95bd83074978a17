'use client';

import { useId } from 'react';
import { Button } from '@/ui/button';
import { joinClasses } from '@/ui/join-classes';
import { Badge } from '@/ui/page-parts';
import { WindStrip } from '@/ui/wind/wind-strip';
import type { SitsAskText } from '../ask-schema';
import type { OpenRow, SitsView } from '../view-types';
import { fetchBookDialog, fetchSitDetail, LazySitDetail } from './load-parts';
import { WordMark } from './word-mark';

interface SitRowProps {
  row: OpenRow;
  view: SitsView;
  ask: SitsAskText;
  open: boolean;
  onToggle: () => void;
  /** null: this person may not book. */
  onBook: (() => void) | null;
}

/** One stand: rank, name, word, strip, a sentence and an action. The whole of it opens what lies behind. */
export function SitRow({ row, view, ask, open, onToggle, onBook }: SitRowProps) {
  const panelId = useId();
  const notes = row.cautions.filter((caution) => caution.level !== 'note');
  return (
    <li className="border-rule border-b" id={row.standId}>
      <div
        className={joinClasses(
          'relative grid grid-cols-[1.75rem_minmax(0,1fr)_auto] items-start gap-x-3 gap-y-2 py-3.5',
          'sm:grid-cols-[2.5rem_minmax(0,1fr)_10rem_7rem] sm:gap-x-5 sm:px-1 hover:bg-panel',
        )}
      >
        <span className="font-serif text-ink-soft text-xl leading-snug" aria-hidden="true">
          {row.rank}
        </span>
        <div className="min-w-0">
          <h3 className="flex flex-wrap items-baseline gap-x-2.5 gap-y-1">
            <button
              type="button"
              data-row
              aria-expanded={open}
              aria-controls={panelId}
              onClick={onToggle}
              onPointerEnter={fetchSitDetail}
              onFocus={fetchSitDetail}
              className="text-left font-serif text-lg leading-snug after:absolute after:inset-0 after:content-['']"
            >
              <span className="sr-only">{row.rank}. </span>
              {row.name}
              <span aria-hidden="true" className="ml-1.5 inline-block text-ink-soft">
                {open ? '▴' : '▾'}
              </span>
            </button>
            <WordMark word={row.word} />
            {row.mine && <Badge look="strong">Your sit</Badge>}
          </h3>
          <p className="mt-1 hidden sm:block">{row.sentence}</p>
          {notes.map((caution) => (
            <p key={caution.text} className="mt-1 hidden font-semibold text-clay text-sm sm:block">
              {caution.text}
            </p>
          ))}
        </div>
        <div className="col-start-2 row-start-2 sm:col-start-3 sm:row-start-1 sm:pt-1">
          <WindStrip arcs={row.arcs} rows={[{ at: view.window.startAt, shares: row.shares, hold: row.hold }]} />
        </div>
        <div className="relative z-10 col-start-3 row-start-1 sm:col-start-4 sm:justify-self-end">
          {onBook && !row.mine && (
            <Button
              look={row.rank === 1 && !view.mine ? 'primary' : 'plain'}
              onClick={onBook}
              onPointerEnter={fetchBookDialog}
              onFocus={fetchBookDialog}
            >
              {view.mine ? 'Move here' : 'Book'}
              <span className="sr-only">{view.mine ? `: ${row.name}` : ` ${row.name}`}</span>
            </Button>
          )}
        </div>
        <div className="col-span-2 col-start-2 row-start-3 sm:hidden">
          <p>{row.sentence}</p>
          {notes.map((caution) => (
            <p key={caution.text} className="mt-1 font-semibold text-clay text-sm">
              {caution.text}
            </p>
          ))}
        </div>
      </div>
      <div id={panelId} hidden={!open}>
        {open && <LazySitDetail view={view} standId={row.standId} ask={ask} />}
      </div>
    </li>
  );
}
