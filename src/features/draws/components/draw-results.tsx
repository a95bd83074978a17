import type { ComponentProps } from 'react';
import { Badge } from '@/ui/page-parts';
import type { DrawResultLine, SlotResults } from '../reads';
import { RESULT_LIST_WORDS as WORDS } from '../words/results';
import { DrawButton } from './draw-button';

type Act<Values> = ComponentProps<typeof DrawButton<Values>>['act'];
type SwapValues = { drawId: string; memberId: string; slot: number };

export interface DrawResultsProps {
  club: string;
  draw: { id: string; published: boolean };
  results: SlotResults;
  offer: Act<SwapValues>;
  accept: Act<SwapValues>;
  giveBack: Act<{ sitId: string }>;
}

/** Every member who wanted a window, in the order of turns: what they were given, why, and what can be done afterwards. */
export function DrawResults(props: DrawResultsProps) {
  const { lines } = props.results;
  const own = lines.find((line) => line.own);
  return (
    <ol className="divide-y divide-rule">
      {lines.map((line) => (
        <li key={line.memberId} className="flex flex-wrap items-start justify-between gap-3 py-3">
          <div className="min-w-0 max-w-2xl">
            <p className="flex flex-wrap items-baseline gap-x-2">
              <span className="font-serif text-ink-soft tabular-nums">{line.turn}</span>
              <strong className="font-serif">{line.own ? WORDS.you(line.name) : line.name}</strong>
              <span>{line.stand ?? WORDS.noStand}</span>
              {line.guests.length > 0 && <span className="text-ink-soft">{WORDS.withGuests(line.guests)}</span>}
              {line.gone && <Badge>{WORDS.gone}</Badge>}
            </p>
            <ul className="mt-1 text-ink-soft text-sm">
              {line.reasons.map((reason) => (
                <li key={reason}>{reason}</li>
              ))}
            </ul>
          </div>
          {own && <LineButton {...props} line={line} own={own} />}
        </li>
      ))}
    </ol>
  );
}

/** Give back one's own; take or offer a swap with another's. */
function LineButton(props: DrawResultsProps & { line: DrawResultLine; own: DrawResultLine }) {
  const { club, draw, results, line, own, offer, accept, giveBack } = props;
  if (!draw.published || !own.held || !line.held || own.stand === null || line.stand === null) return null;
  const values = { drawId: draw.id, memberId: line.memberId, slot: results.slot };
  if (line.own) {
    return results.ownSitId === null ? null : (
      <DrawButton
        club={club}
        values={{ sitId: results.ownSitId }}
        label={WORDS.giveBack}
        title={WORDS.giveBackTitle(line.stand)}
        done={WORDS.givenBack(line.stand)}
        look="quiet"
        danger
        act={giveBack}
      >
        {WORDS.giveBackText}
      </DrawButton>
    );
  }
  if (line.offersTo === own.memberId) {
    return (
      <DrawButton
        club={club}
        values={values}
        label={WORDS.take}
        about={WORDS.takeAbout(line.name)}
        title={WORDS.takeTitle(own.stand, line.stand)}
        done={WORDS.taken(line.stand)}
        look="primary"
        act={accept}
      >
        {WORDS.takeText(line.name, line.stand, own.stand)}
      </DrawButton>
    );
  }
  if (own.offersTo === line.memberId) return <Badge>{WORDS.offered}</Badge>;
  return (
    <DrawButton
      club={club}
      values={values}
      label={WORDS.offer}
      about={WORDS.offerAbout(line.name)}
      title={WORDS.offerTitle(own.stand, line.stand)}
      done={WORDS.offered}
      look="quiet"
      act={offer}
    >
      {WORDS.offerText(line.name)}
    </DrawButton>
  );
}
