import type { PointShare } from '../reads';

const percent = (share: number) => `${(share * 100).toFixed(share > 0 && share < 0.1 ? 1 : 0)} %`;

/** One bar a compass point: solid what stands cover, hatched what a trial would add, open what nobody covers. */
export function PointBars({ points, label, trial }: { points: PointShare[]; label: string; trial: boolean }) {
  const most = Math.max(0.01, ...points.map(({ share }) => share));
  const width = (share: number) => `${(100 * share) / most}%`;
  return (
    <figure aria-label={label}>
      <ul className="grid gap-1">
        {points.map((point) => {
          const open = Math.max(0, point.share - point.covered - point.added);
          const added = point.added > 0 ? `, ${percent(point.added)} by the trial` : '';
          return (
            <li key={point.name} className="grid grid-cols-[3rem_minmax(0,1fr)_4rem] items-center gap-2 text-sm">
              <span className="font-semibold">{point.name}</span>
              <span aria-hidden="true" className="flex h-4 items-stretch">
                <span className="bg-ink" style={{ width: width(point.covered) }} />
                <span
                  className="border-moss border-y bg-[repeating-linear-gradient(45deg,var(--color-moss)_0_3px,transparent_3px_6px)]"
                  style={{ width: width(point.added) }}
                />
                <span className={open > 0 ? 'border border-ink' : ''} style={{ width: width(open) }} />
              </span>
              <span className="text-right">
                {percent(point.share)}
                <span className="sr-only">
                  : {percent(point.covered)} covered{added}, {percent(open)} uncovered
                </span>
              </span>
            </li>
          );
        })}
      </ul>
      <figcaption className="mt-2 text-ink-soft text-sm">
        Solid: some stand has this wind in a good arc. {trial && 'Hatched: only the trial has. '}Open: nobody.
      </figcaption>
    </figure>
  );
}
