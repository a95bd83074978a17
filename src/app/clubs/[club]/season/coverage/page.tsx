import { formatDay } from '@/core/day-time';
import { TrialStand } from '@/features/coverage/components/trial-stand';
import { WindowSection } from '@/features/coverage/components/window-section';
import { readCoverageAsk } from '@/features/coverage/coverage-schema';
import { readCoverage } from '@/features/coverage/reads';
import { shareText } from '@/features/coverage/share-text';
import { TRIAL_WORDS, COVERAGE_WORDS as W } from '@/features/coverage/words';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { FigureHead, FigureTable } from '@/ui/figure-table';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { TBody, Td, THead, Th, Tr } from '@/ui/table';

export const metadata = { title: W.title };

export default clubPage('features.read', async ({ scope, search }) => {
  const { slug, name } = scope.club;
  const view = await readCoverage(scope, now());
  const lead =
    view.fromDay && view.toDay
      ? W.leadOf(view.source, formatDay(view.fromDay, true), formatDay(view.toDay, true))
      : W.lead;
  if (view.windows.length === 0) {
    return (
      <>
        <PageTitle over={name} title={W.title} lead={lead} />
        <EmptyState
          title={W.noHours}
          action={<ButtonLink href={`/clubs/${slug}/season/coverage`}>{W.again}</ButtonLink>}
        >
          {view.error ?? W.outside}
        </EmptyState>
      </>
    );
  }
  return (
    <>
      <PageTitle
        over={name}
        title={W.title}
        lead={lead}
        actions={<ButtonLink href="#trial">{TRIAL_WORDS.title}</ButtonLink>}
      />
      {view.stands.length === 0 && (
        <Notice title={W.noStands} className="mb-6">
          {W.noStandsText}
        </Notice>
      )}
      <div className="grid gap-x-10 lg:grid-cols-2">
        {view.windows.map((w) => (
          <WindowSection key={w.window} coverage={w} />
        ))}
      </div>
      <Section id="trial" title={TRIAL_WORDS.title} note={TRIAL_WORDS.note}>
        <TrialStand club={slug} ask={readCoverageAsk(search)} winds={view.winds} />
      </Section>
      <Section title={W.byStand} note={W.byStandNote}>
        <FigureTable caption={W.byStandCaption}>
          <THead>
            <Th>{W.stand}</Th>
            <Th align="right">{W.mornings}</Th>
            <Th align="right">{W.evenings}</Th>
            <Th align="right">{W.ofAll}</Th>
            <Th align="right">{W.alone}</Th>
          </THead>
          <TBody>
            {view.stands.map((stand) => (
              <Tr key={stand.id}>
                <FigureHead>{stand.name}</FigureHead>
                <Td align="right">{stand.morning}</Td>
                <Td align="right">{stand.evening}</Td>
                <Td align="right">{shareText(stand.share)}</Td>
                <Td align="right">{stand.alone}</Td>
              </Tr>
            ))}
          </TBody>
        </FigureTable>
      </Section>
    </>
  );
});
