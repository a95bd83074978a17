import { type Figure, figureText, type Indices, intervalText } from '@/core/indices';
import { DefinitionList } from '@/ui/page-parts';
import { SEASON_FIGURE_WORDS } from '../words/sightings';

const words = SEASON_FIGURE_WORDS;

function Said({ figure, as }: { figure: Figure; as?: 'percent' }) {
  const interval = intervalText(figure, as);
  return (
    <>
      <span className="font-semibold">{figureText(figure, as)}</span>
      {interval !== '' && <span className="text-ink-soft text-sm"> ({interval})</span>}
    </>
  );
}

/** A season in a few figures, each with its counts. */
export function SeasonFigures({ indices, unlogged }: { indices: Indices; unlogged: number }) {
  const { sits, zeroSits, hours, seen, perHour } = indices;

  return (
    <DefinitionList
      className="max-w-2xl"
      items={[
        { term: words.logs, detail: words.logsOf(sits, zeroSits, unlogged) },
        { term: words.hours, detail: hours.toFixed(1) },
        {
          term: words.seen,
          detail: words.seenOf(seen),
        },
        { term: words.deerPerHour, detail: <Said figure={perHour.all} /> },
        { term: words.bucksPerHour, detail: <Said figure={perHour.bucks} /> },
        { term: words.doesPerBuck, detail: <Said figure={indices.doesPerBuck} /> },
        { term: words.fawnsPerDoe, detail: <Said figure={indices.fawnsPerDoe} /> },
        { term: words.unknown, detail: <Said figure={indices.unknownShare} as="percent" /> },
        {
          term: words.bumped,
          detail: (
            <>
              {indices.bumpedSits}, <Said figure={indices.bumpedShare} as="percent" />
            </>
          ),
        },
      ]}
    />
  );
}
