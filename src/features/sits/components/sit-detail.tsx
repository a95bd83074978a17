'use client';

import type { ReactNode } from 'react';
import { Button } from '@/ui/button';
import { ErrorState } from '@/ui/error-state';
import { useRead } from '@/ui/query';
import { SitTimeline } from '@/ui/wind/sit-timeline';
import { mergeRows, type StripRow } from '@/ui/wind/strip-shares';
import { WindStrip } from '@/ui/wind/wind-strip';
import type { SitsAskText } from '../ask-schema';
import { sitDetailQuery } from '../queries';
import type { SitDetailView, SitsBrief, TimelineView } from '../view-types';
import { HOLD_WORDS, DETAIL_WORDS as WORDS } from '../words/detail';
import { clockText, shortClock } from '../words/terms';
import { CompareChoice } from './compare-choice';
import { DetailPart } from './detail-part';
import { ReasonList } from './reason-list';
import { ShareSit } from './share-sit';
import { WalkMap } from './walk-map';
import { WaysIn } from './ways-in';
import { WindByHour } from './wind-by-hour';

export interface SitDetailProps {
  view: SitsBrief;
  standId: string;
  ask: SitsAskText;
  /** Stands there until it is read. */
  loading: ReactNode;
}

/** What lies behind a row, read when it is opened. */
export function SitDetail({ view, standId, ask, loading }: SitDetailProps) {
  const { day, window } = view.window;
  const query = useRead(sitDetailQuery(view.club.slug, standId, { ...ask, day, window }));
  if (query.data) return <DetailBody detail={query.data} view={view} ask={ask} />;
  if (query.isError) {
    return (
      <div className="pb-4">
        <ErrorState title={WORDS.failed} action={<Button onClick={() => query.refetch()}>{WORDS.again}</Button>}>
          {query.error.message}
        </ErrorState>
      </div>
    );
  }
  return loading;
}

function holdText(detail: SitDetailView, view: SitsBrief): string | null {
  const { hold } = detail;
  if (!hold) return null;
  const at = (instant: number) => clockText(instant, view.club);
  const percent = (share: number) => `${Math.round(share * 100)} %`;
  let leaves: string = HOLD_WORDS.stays;
  if (hold.leavesAt !== null) {
    leaves = hold.leavesAt > view.window.startAt ? HOLD_WORDS.leavesAt(at(hold.leavesAt)) : HOLD_WORDS.outFromStart;
  }
  return HOLD_WORDS.hold({
    share: percent(hold.share),
    never: percent(hold.neverLeaves),
    leaves,
    worstAt: at(hold.worstAt),
    worst: percent(hold.worstShare),
  });
}

/** A row an hour: the mean of its two half hours. */
function hourRows(steps: TimelineView[]): StripRow[] {
  const rows = steps.map(({ at, shares, arcHold }): StripRow => ({ at, shares, hold: arcHold }));
  return rows.flatMap((row, i) => (i % 2 === 0 ? [mergeRows(rows.slice(i, i + 2)) ?? row] : []));
}

function marksOf(view: SitsBrief) {
  const { rise, set } = view.sky;
  return [
    ...(rise === null ? [] : [{ at: rise, label: WORDS.sunrise }]),
    ...(set === null ? [] : [{ at: set, label: WORDS.sunset }]),
  ];
}

function DetailBody({ detail, view, ask }: { detail: SitDetailView; view: SitsBrief; ask: SitsAskText }) {
  const short = (at: number) => shortClock(at, view.club);
  const hold = holdText(detail, view);
  const known = detail.timeline.some((step) => step.shares !== null);
  const hours = detail.timeline.filter((_, step) => step % 2 === 0);
  return (
    <div className="grid gap-x-10 gap-y-6 pt-1 pb-8 sm:pl-15 lg:grid-cols-2">
      <p className="lg:col-span-2">
        <Figure name={WORDS.score} value={detail.score} /> <Figure name={WORDS.quiet} value={detail.quiet} />{' '}
        <Figure name={WORDS.promise} value={detail.promise} />
        <span className="block text-ink-soft text-sm">{WORDS.figures}</span>
      </p>
      {detail.cautions.length > 0 && (
        <DetailPart title={WORDS.care} className="lg:col-span-2">
          <ul className="list-disc pl-5 marker:text-clay">
            {detail.cautions.map((caution) => (
              <li key={caution.text} className={caution.level === 'note' ? undefined : 'font-semibold'}>
                {caution.text}
              </li>
            ))}
          </ul>
        </DetailPart>
      )}
      <DetailPart title={WORDS.wayIn}>
        <WaysIn ways={detail.ways} club={view.club} />
        {detail.mayMap && (
          <WalkMap club={view.club.slug} standId={detail.standId} approachId={detail.ways[0]?.approachId ?? null} />
        )}
      </DetailPart>
      <DetailPart title={WORDS.why}>
        <ReasonList reasons={detail.reasons} />
      </DetailPart>
      {known && (
        <DetailPart title={WORDS.through} className="min-w-0">
          <SitTimeline steps={detail.timeline} formatClock={short} marks={marksOf(view)} />
        </DetailPart>
      )}
      {known && (
        <DetailPart title={WORDS.wind} className="min-w-0">
          {hold && <p className="mb-2">{hold}</p>}
          <WindStrip variant="page" arcs={detail.arcs} rows={hourRows(detail.timeline)} formatClock={short} />
          <WindByHour hours={hours} club={view.club} />
        </DetailPart>
      )}
      {detail.counterfactuals.length > 0 && (
        <DetailPart title={WORDS.change}>
          <ul className="list-disc pl-5 marker:text-ink-soft">
            {detail.counterfactuals.map((text) => (
              <li key={text}>{text}</li>
            ))}
          </ul>
        </DetailPart>
      )}
      <DetailPart title={WORDS.sure}>
        <p>
          <span className="font-semibold">{WORDS.howSure[detail.confidence.level]}</span>{' '}
          {WORDS.sureBecause(detail.confidence.text)}
        </p>
      </DetailPart>
      <div className="flex flex-wrap items-end gap-4 lg:col-span-2 print:hidden">
        <CompareChoice view={view} ask={ask} standId={detail.standId} />
        <ShareSit view={view} standId={detail.standId} />
      </div>
    </div>
  );
}

function Figure({ name, value }: { name: string; value: number }) {
  return (
    <span className="mr-3 whitespace-nowrap">
      {name} <span className="font-serif text-lg">{Math.round(value)}</span>
    </span>
  );
}
