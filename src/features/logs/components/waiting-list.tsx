import { ButtonLink } from '@/ui/button';
import type { WaitingLine } from '../reads';
import { WAITING_WORDS } from '../words/screen';

/** Sits without a log, one press from its form. */
export function WaitingList({ club, lines }: { club: string; lines: WaitingLine[] }) {
  return (
    <ul className="border-rule border-t">
      {lines.map((line) => (
        <li key={line.sitId} className="flex items-center justify-between gap-4 border-rule border-b py-3">
          <div className="min-w-0">
            <p className="font-serif text-lg leading-snug">{line.standName}</p>
            <p className="text-ink-soft">{WAITING_WORDS.when(line.memberName, line.whenText, line.timeText)}</p>
          </div>
          <ButtonLink href={`/clubs/${club}/log/${line.sitId}`} look="primary" className="shrink-0">
            {WAITING_WORDS.write}
            <span className="sr-only">{WAITING_WORDS.of(line.standName)}</span>
          </ButtonLink>
        </li>
      ))}
    </ul>
  );
}
