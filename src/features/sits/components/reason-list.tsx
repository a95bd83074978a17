import type { ReasonView } from '../view-types';
import { REASON_WORDS } from '../words/detail';
import { EVIDENCE_WORDS, pointsText } from '../words/terms';

/** Each reason with the points of sit score it gives or takes, and what it rests on. */
export function ReasonList({ reasons }: { reasons: ReasonView[] }) {
  if (reasons.length === 0) return <p>{REASON_WORDS.none}</p>;
  return (
    <ul>
      {reasons.map((reason) => (
        <li key={reason.code} className="beside grid gap-x-3 border-rule border-b py-1.5 last:border-b-0">
          <span className="text-right font-semibold">
            {pointsText(reason.change)}
            <span className="sr-only">{REASON_WORDS.points}</span>
          </span>
          <span>
            {reason.text}{' '}
            <span className="whitespace-nowrap text-ink-soft text-sm">
              {REASON_WORDS.basis(reason.part, EVIDENCE_WORDS[reason.evidence])}
            </span>
          </span>
        </li>
      ))}
    </ul>
  );
}
