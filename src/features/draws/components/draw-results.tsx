import type { ComponentProps } from 'react';
import { Badge } from '@/ui/page-parts';
import type { DrawResultLine, DrawScreen } from '../reads';
import { DrawButton } from './draw-button';

type Act<Values> = ComponentProps<typeof DrawButton<Values>>['act'];

export interface DrawResultsProps {
  club: string;
  draw: Pick<DrawScreen, 'id' | 'state' | 'results' | 'ownSitId'>;
  offer: Act<{ drawId: string; memberId: string }>;
  accept: Act<{ drawId: string; memberId: string }>;
  giveBack: Act<{ sitId: string }>;
}

/** Every member in the order of turns: what they were given and why, and what can be done about it afterwards. */
export function DrawResults({ club, draw, offer, accept, giveBack }: DrawResultsProps) {
  const results = draw.results ?? [];
  const own = results.find((line) => line.own);
  const swaps = draw.state === 'published' && own?.held === true;
  const buttons = (line: DrawResultLine) => {
    if (!swaps || !line.held) return null;
    const values = { drawId: draw.id, memberId: line.memberId };
    if (line.own) {
      return draw.ownSitId === null ? null : (
        <DrawButton
          club={club}
          values={{ sitId: draw.ownSitId }}
          label="Give it back"
          title={`Give back ${line.stand}`}
          done={`${line.stand} is free again`}
          look="quiet"
          danger
          act={giveBack}
        >
          Your sit is cancelled and the stand is free for others. Your points stay as the draw left them.
        </DrawButton>
      );
    }
    if (line.offersTo === own.memberId) {
      return (
        <DrawButton
          club={club}
          values={values}
          label="Take the swap"
          about={`with ${line.name}`}
          title={`Swap ${own.stand} for ${line.stand}`}
          done={`You have ${line.stand}`}
          look="primary"
          act={accept}
        >
          {line.name} offers {line.stand} for {own.stand}. Both sits change hands at once, if every rule allows it.
        </DrawButton>
      );
    }
    if (own.offersTo === line.memberId) return <Badge>Swap offered</Badge>;
    return (
      <DrawButton
        club={club}
        values={values}
        label="Offer a swap"
        about={`to ${line.name}`}
        title={`Offer ${own.stand} for ${line.stand}`}
        done="Swap offered"
        look="quiet"
        act={offer}
      >
        {line.name} sees the offer on this page and may take it.
      </DrawButton>
    );
  };
  return (
    <ol className="divide-y divide-rule">
      {results.map((line) => (
        <li key={line.memberId} className="flex flex-wrap items-start justify-between gap-3 py-3">
          <div className="max-w-2xl">
            <p>
              <span className="mr-2 font-serif text-ink-soft">{line.turn}</span>
              <strong className="font-serif">{line.own ? `${line.name} (you)` : line.name}</strong>
              {': '}
              {line.stand ?? 'no stand'}
              {line.gone && <Badge>Given up since</Badge>}
            </p>
            <ul className="mt-1 text-ink-soft text-sm">
              {line.reasons.map((reason) => (
                <li key={reason}>{reason}</li>
              ))}
            </ul>
          </div>
          {buttons(line)}
        </li>
      ))}
    </ol>
  );
}
