import { TextLink } from '@/ui/button';
import { WORK_NOTE_WORDS as W } from '../words/findings';
import type { WorkNote } from '../work-rules';

/** What the club has written down of the kinds of work a finding may take. */
export function WorkRules({ club, notes, mayWrite }: { club: string; notes: WorkNote[]; mayWrite: boolean }) {
  if (notes.length === 0) return null;
  const blank = notes.some(({ isWritten }) => !isWritten);
  return (
    <div className="max-w-prose border-rule-strong border-l-2 pl-3 text-sm">
      <ul>
        {notes.map(({ work, text }) => (
          <li key={work}>{text}</li>
        ))}
      </ul>
      <p>
        {W.decide} {blank && mayWrite && <TextLink href={`/clubs/${club}/club/rules/edit#work`}>{W.write}</TextLink>}
        {blank && !mayWrite && W.whoWrites}
      </p>
    </div>
  );
}
