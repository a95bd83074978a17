import type { PointShare } from '../reads';
import { shareText } from '../share-text';
import { BARS_WORDS as W } from '../words';

/** One bar a compass point: solid what stands cover, hatched what a trial would add, open what nobody covers. */
export function PointBars({ points, label, trial = false }: { points: PointShare[]; label: string; trial?: boolean }) {
  const most = Math.max(0.01, ...points.map(({ share }) => share));
  const width = (share: number) => `${(100 * share) / most}%`;
  return (
    <figure aria-label={label}>
      <ul className="grid gap-1">
        {points.map((point) => {
          const open = Math.max(0, point.share - point.covered - point.added);
          return (
            <li key={point.name} className="grid grid-cols-[3rem_minmax(0,1fr)_4rem] items-center gap-2 text-sm">
              <span className="font-semibold">{point.name}</span>
              <span aria-hidden="true" className="flex h-4 items-stretch">
                <span className="bg-ink" style={{ width: width(point.covered) }} />
                <span className="border-moss border-y hatched" style={{ width: width(point.added) }} />
                <span className={open > 0 ? 'border border-ink' : ''} style={{ width: width(open) }} />
              </span>
              <span className="text-right tabular-nums">
                {shareText(point.share)}
                <span className="sr-only">
                  {W.said(shareText(point.covered), point.added > 0 ? shareText(point.added) : '', shareText(open))}
                </span>
              </span>
            </li>
          );
        })}
      </ul>
      <figcaption className="mt-2 text-ink-soft text-sm">{trial ? W.legendTrial : W.legend}</figcaption>
    </figure>
  );
}
