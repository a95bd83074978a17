import { type Figure, figureText, type Indices, intervalText } from '@/core/indices';
import { DefinitionList } from '@/ui/page-parts';

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
  const missing =
    unlogged === 0 ? 'none is missing' : `${unlogged} ${unlogged === 1 ? 'sit has' : 'sits have'} none yet`;
  return (
    <DefinitionList
      className="max-w-2xl"
      items={[
        { term: 'Logs', detail: `${sits}, ${zeroSits} of them without a deer; ${missing}` },
        { term: 'Hours sat', detail: hours.toFixed(1) },
        {
          term: 'Deer seen',
          detail: `${seen.all}: ${seen.bucks} antlered bucks, ${seen.does} does, ${seen.fawns} fawns, ${seen.unknown} unknown`,
        },
        { term: 'Deer an hour', detail: <Said figure={perHour.all} /> },
        { term: 'Bucks an hour', detail: <Said figure={perHour.bucks} /> },
        { term: 'Does per buck', detail: <Said figure={indices.doesPerBuck} /> },
        { term: 'Fawns per doe', detail: <Said figure={indices.fawnsPerDoe} /> },
        { term: 'Not made out', detail: <Said figure={indices.unknownShare} as="percent" /> },
        {
          term: 'Sits with a bump',
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
