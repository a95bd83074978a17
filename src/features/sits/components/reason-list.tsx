import type { ReasonView } from '../view-types';
import { EVIDENCE_WORDS, pointsText } from '../words';

/** Each reason with the points of sit score it gives or takes, and what it rests on. */
export function ReasonList({ reasons }: { reasons: ReasonView[] }) {
  if (reasons.length === 0) return <p>Nothing speaks for or against it beyond the ordinary.</p>;
  return (
    <ul>
      {reasons.map((reason) => (
        <li
          key={reason.code}
          className="grid grid-cols-[2.5rem_minmax(0,1fr)] gap-x-3 border-rule border-b py-1.5 last:border-b-0"
        >
          <span className="text-right font-semibold">
            {pointsText(reason.change)}
            <span className="sr-only"> points: </span>
          </span>
          <span>
            {reason.text}{' '}
            <span className="whitespace-nowrap text-ink-soft text-sm">
              {reason.part}; {EVIDENCE_WORDS[reason.evidence]}
            </span>
          </span>
        </li>
      ))}
    </ul>
  );
}
