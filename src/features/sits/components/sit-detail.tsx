'use client';

import { Button } from '@/ui/button';
import { ErrorState, Loading } from '@/ui/notices';
import { useRead } from '@/ui/query';
import { SitTimeline } from '@/ui/wind/sit-timeline';
import { mergeRows, type StripRow } from '@/ui/wind/strip-shares';
import { WindStrip } from '@/ui/wind/wind-strip';
import type { SitsAskText } from '../ask-schema';
import { sitDetailQuery } from '../queries';
import type { SitDetailView, SitsView, TimelineView } from '../view-types';
import { clockText, shortClock } from '../words';
import { CompareChoice } from './compare-choice';
import { DetailPart } from './detail-part';
import { ReasonList } from './reason-list';
import { ShareSit } from './share-sit';
import { WalkMap } from './walk-map';
import { WaysIn } from './ways-in';
import { WindByHour } from './wind-by-hour';

interface SitDetailProps {
  view: SitsView;
  standId: string;
  ask: SitsAskText;
}

/** What lies behind a row, read when it is opened. */
export function SitDetail({ view, standId, ask }: SitDetailProps) {
  const { day, window } = view.window;
  const query = useRead(sitDetailQuery(view.club.slug, standId, { ...ask, day, window }));
  if (query.data) return <DetailBody detail={query.data} view={view} ask={ask} />;
  if (query.isError) {
    return (
      <div className="pb-4">
        <ErrorState
          title="This stand could not be read"
          action={<Button onClick={() => query.refetch()}>Try again</Button>}
        >
          {query.error.message}
        </ErrorState>
      </div>
    );
  }
  return <Loading label="Reading the stand" lines={4} />;
}

function holdText(detail: SitDetailView, view: SitsView): string | null {
  const { hold } = detail;
  if (!hold) return null;
  const at = (instant: number) => clockText(instant, view.club);
  const percent = (share: number) => `${Math.round(share * 100)} %`;
  let leaves = 'it more likely stays than leaves';
  if (hold.leavesAt !== null) {
    leaves =
      hold.leavesAt > view.window.startAt
        ? `it likeliest leaves at ${at(hold.leavesAt)}`
        : 'it may be out of it from the start';
  }
  return `In a good arc for ${percent(hold.share)} of the sit; ${percent(hold.neverLeaves)} that it never leaves, and ${leaves}. Worst half hour: ${at(hold.worstAt)}, ${percent(hold.worstShare)}.`;
}

/** A row an hour: the mean of its two half hours. */
function hourRows(steps: TimelineView[]): StripRow[] {
  const rows = steps.map(({ at, shares, arcHold }): StripRow => ({ at, shares, hold: arcHold }));
  return rows.flatMap((row, i) => (i % 2 === 0 ? [mergeRows(rows.slice(i, i + 2)) ?? row] : []));
}

function marksOf(view: SitsView) {
  const { rise, set } = view.sky;
  return [
    ...(rise === null ? [] : [{ at: rise, label: 'sunrise' }]),
    ...(set === null ? [] : [{ at: set, label: 'sunset' }]),
  ];
}

function DetailBody({ detail, view, ask }: { detail: SitDetailView; view: SitsView; ask: SitsAskText }) {
  const short = (at: number) => shortClock(at, view.club);
  const hold = holdText(detail, view);
  const known = detail.timeline.some((step) => step.shares !== null);
  const hours = detail.timeline.filter((_, step) => step % 2 === 0);
  return (
    <div className="grid gap-x-10 gap-y-6 pt-1 pb-8 sm:pl-[3.75rem] lg:grid-cols-2">
      <p className="lg:col-span-2">
        <Figure name="Sit score" value={detail.score} /> <Figure name="quiet" value={detail.quiet} />{' '}
        <Figure name="promise" value={detail.promise} />
        <span className="block text-ink-soft text-sm">
          Quiet: in, sat and out with no deer alerted. Promise: deer in range in daylight. Quiet weighs more.
        </span>
      </p>
      {detail.cautions.length > 0 && (
        <DetailPart title="Take care" className="lg:col-span-2">
          <ul className="list-disc pl-5 marker:text-clay">
            {detail.cautions.map((caution) => (
              <li key={caution.text} className={caution.level === 'note' ? undefined : 'font-semibold'}>
                {caution.text}
              </li>
            ))}
          </ul>
        </DetailPart>
      )}
      <DetailPart title="Way in">
        <WaysIn ways={detail.ways} club={view.club} />
        {detail.mayMap && (
          <WalkMap club={view.club.slug} standId={detail.standId} approachId={detail.ways[0]?.approachId ?? null} />
        )}
      </DetailPart>
      <DetailPart title="Why this score">
        <ReasonList reasons={detail.reasons} />
      </DetailPart>
      {known && (
        <DetailPart title="Through the sit" className="min-w-0">
          <SitTimeline steps={detail.timeline} formatClock={short} marks={marksOf(view)} />
        </DetailPart>
      )}
      {known && (
        <DetailPart title="Where the wind will be" className="min-w-0">
          {hold && <p className="mb-2">{hold}</p>}
          <WindStrip variant="page" arcs={detail.arcs} rows={hourRows(detail.timeline)} formatClock={short} />
          <WindByHour hours={hours} club={view.club} />
        </DetailPart>
      )}
      {detail.counterfactuals.length > 0 && (
        <DetailPart title="What would change it">
          <ul className="list-disc pl-5 marker:text-ink-soft">
            {detail.counterfactuals.map((text) => (
              <li key={text}>{text}</li>
            ))}
          </ul>
        </DetailPart>
      )}
      <DetailPart title="How sure">
        <p>
          <span className="font-semibold">{SURE[detail.confidence.level]}</span> {detail.confidence.text}.
        </p>
      </DetailPart>
      <div className="flex flex-wrap items-end gap-4 lg:col-span-2 print:hidden">
        <CompareChoice view={view} ask={ask} standId={detail.standId} />
        <ShareSit view={view} standId={detail.standId} />
      </div>
    </div>
  );
}

const SURE = { high: 'Sure.', fair: 'Fairly sure.', low: 'Not sure.', none: 'No forecast to be sure of.' } as const;

function Figure({ name, value }: { name: string; value: number }) {
  return (
    <span className="mr-3 whitespace-nowrap">
      {name} <span className="font-serif text-lg">{Math.round(value)}</span>
    </span>
  );
}
