import { Loading } from '@/ui/notices';
import { Badge } from '@/ui/page-parts';
import { WindStrip } from '@/ui/wind/wind-strip';
import type { OpenRow } from '../view-types';
import { DETAIL_LOADING_WORDS, SIT_LIST_WORDS } from '../words/list';
import { BookButton, RowButton, RowPanel } from './open-rows';
import { WordMark } from './word-mark';

interface SitRowProps {
  row: OpenRow;
  startAt: number;
  /** Where what lies behind it is read: the service worker keeps that ahead. */
  detail: string;
  mayBook: boolean;
}

/** One stand: rank, name, word, strip, a sentence and an action. The whole of it opens what lies behind. */
export function SitRow({ row, startAt, detail, mayBook }: SitRowProps) {
  const notes = row.cautions.filter((caution) => caution.level !== 'note');
  return (
    <li className="border-rule border-b" id={row.standId} data-detail={detail}>
      <div className="sit-row relative grid items-start gap-x-3 gap-y-2 py-3.5 hover:bg-panel lg:gap-x-5 lg:gap-y-1 lg:px-1">
        <span className="font-serif text-ink-soft text-xl leading-snug" aria-hidden="true">
          {row.rank}
        </span>
        <h3 className="flex min-w-0 flex-wrap items-baseline gap-x-2.5 gap-y-1">
          <RowButton standId={row.standId}>
            <span className="sr-only">{SIT_LIST_WORDS.rank(row.rank)}</span>
            {row.name}
          </RowButton>
          {row.mine && <Badge look="strong">{SIT_LIST_WORDS.yourSit}</Badge>}
        </h3>
        <div className="col-start-3 row-start-2 self-center lg:row-start-1">
          <WordMark word={row.word} />
        </div>
        <div className="col-start-2 row-start-2 lg:col-start-4 lg:row-span-2 lg:row-start-1 lg:pt-1">
          <WindStrip arcs={row.arcs} rows={[{ at: startAt, shares: row.shares, hold: row.hold }]} />
        </div>
        <div className="relative z-10 col-start-3 row-start-1 lg:col-start-5 lg:row-span-2 lg:justify-self-end">
          {mayBook && !row.mine && <BookButton standId={row.standId} name={row.name} first={row.rank === 1} />}
        </div>
        <div className="col-span-2 col-start-2 row-start-3 lg:row-start-2">
          <p className="text-pretty">{row.sentence}</p>
          {notes.map((caution) => (
            <p key={caution.text} className="mt-1 font-semibold text-clay text-sm">
              {caution.text}
            </p>
          ))}
        </div>
      </div>
      <RowPanel standId={row.standId} loading={<Loading label={DETAIL_LOADING_WORDS.reading} lines={4} />} />
    </li>
  );
}
