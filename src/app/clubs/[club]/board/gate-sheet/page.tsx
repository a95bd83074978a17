import type { Metadata } from 'next';
import { isDay } from '@/core/day-time';
import { GateSheetView } from '@/features/board/components/gate-sheet';
import { PrintButton } from '@/features/board/components/print-button';
import { readGateSheet } from '@/features/board/gate-sheet/read-gate-sheet';
import { GATE_PAGE_WORDS as WORDS } from '@/features/board/words/gate-sheet';
import { windowToPick } from '@/features/sits/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle } from '@/ui/page-parts';

export const metadata: Metadata = { title: WORDS.title };

/** A day of this century, else the one whose sits come next. */
function dayAsked(asked: string | string[] | undefined, next: string): string {
  return typeof asked === 'string' && isDay(asked) && asked >= '2000-01-02' && asked <= '2099-12-30' ? asked : next;
}

export default clubPage('board.read', async ({ scope, search }) => {
  const { slug, name } = scope.club;
  const at = now();
  const sheet = await readGateSheet(scope, dayAsked(search.day, windowToPick(at, scope.club).day), at);
  const address = `/clubs/${slug}/board/gate-sheet`;
  return (
    <>
      <div className="print:hidden">
        <PageTitle
          over={name}
          title={WORDS.title}
          lead={WORDS.lead}
          actions={
            <>
              <ButtonLink href={`${address}?day=${sheet.before}`}>{WORDS.dayBefore}</ButtonLink>
              <ButtonLink href={`${address}?day=${sheet.after}`}>{WORDS.dayAfter}</ButtonLink>
              <PrintButton />
            </>
          }
        />
      </div>
      <GateSheetView sheet={sheet} />
    </>
  );
});
