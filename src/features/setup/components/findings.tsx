import type { ActionResult } from '@/server/doors';
import type { ClubScope } from '@/server/scope';
import { Button, ButtonLink } from '@/ui/button';
import { EmptyState } from '@/ui/notices';
import { Section } from '@/ui/page-parts';
import { Select } from '@/ui/text-inputs';
import { chooseFindings } from '../choose-findings';
import { type FindingView, readSetup, type SetupView } from '../reads';
import type { AcceptFinding, DismissFinding } from '../setup-schema';
import { SETUP_WORDS as W } from '../words/findings';
import { AnswerFinding, ReopenFinding } from './answer-dialogs';
import { FindingCard } from './finding-card';
import { FindingsMap } from './findings-map';

export interface FindingsProps {
  scope: ClubScope;
  now: number;
  search: Record<string, string | string[] | undefined>;
  accept: (club: string, values: AcceptFinding) => Promise<ActionResult<{ choreId: string }>>;
  dismiss: (club: string, values: DismissFinding) => Promise<ActionResult<{ key: string }>>;
  reopen: (club: string, values: { key: string }) => Promise<ActionResult<{ key: string }>>;
}

function noteOf({ windsFrom, ownSettings, counts }: SetupView): string {
  const { cameras, camerasBlind } = counts;
  return [
    windsFrom ? W.windsFrom(windsFrom) : W.windsUnknown,
    W.practice(ownSettings),
    camerasBlind > 0 ? W.camerasBlind(camerasBlind, cameras) : '',
  ]
    .filter(Boolean)
    .join(' ');
}

/** The findings of a club by stand, the worst first, with what was answered below. Comes after the page: weighing takes a moment. */
export async function Findings({ scope, now, search, accept, dismiss, reopen }: FindingsProps) {
  const view = await readSetup(scope, now);
  const { slug } = scope.club;
  const may = scope.can('features.write');
  const common = { club: slug, mayOpenChores: scope.can('chores.read'), mayWriteRules: scope.can('rules.write') };
  if (view.counts.stands === 0 || view.counts.features === 0) {
    return (
      <EmptyState title={W.nothingYet} action={<ButtonLink href={`/clubs/${slug}/ground`}>{W.toGround}</ButtonLink>}>
        {W.nothingYetText}
      </EmptyState>
    );
  }
  const { groups, open, stand, what, stands, kinds } = chooseFindings(view.open, search);
  const answers = ({ key, print, text, acts }: FindingView) =>
    may && <AnswerFinding club={slug} finding={{ key, print, text, acts }} accept={accept} dismiss={dismiss} />;
  const numbered = groups.flatMap((group) => group.findings);
  return (
    <>
      <Section title={W.count(open.length)} note={noteOf(view)}>
        {view.open.length === 0 ? (
          <EmptyState title={W.nothingFound}>{W.nothingFoundText}</EmptyState>
        ) : (
          <>
            <form method="get" className="mb-4 grid grid-cols-2 items-end gap-3 sm:flex sm:flex-wrap sm:gap-4">
              <Select label={W.filterStand} name="stand" defaultValue={stand} options={stands} />
              <Select label={W.filterKind} name="what" defaultValue={what} options={kinds} />
              <Button type="submit">{W.show}</Button>
            </form>
            <FindingsMap club={slug} findings={numbered.map(({ finding }) => ({ at: finding.at }))} />
            {open.length === 0 && <p className="mt-4 text-ink-soft">{W.nothingOfKind}</p>}
            {groups.map((group) => (
              <section key={group.stand?.id ?? 'none'} className="mt-5 border-rule-strong border-t pt-2">
                <div className="flex flex-wrap items-baseline justify-between gap-x-4">
                  <h3 className="font-serif text-lg">{group.stand?.name ?? W.noStand}</h3>
                  <p className="text-ink-soft text-sm">{W.group(group.findings.length, group.gain)}</p>
                </div>
                <ol>
                  {group.findings.map(({ finding, number }) => (
                    <FindingCard key={finding.key} {...common} finding={finding} number={number}>
                      {answers(finding)}
                    </FindingCard>
                  ))}
                </ol>
              </section>
            ))}
          </>
        )}
      </Section>
      {view.answered.length > 0 && (
        <Section title={W.answered} note={W.answeredNote}>
          <ul>
            {view.answered.map((finding) => (
              <FindingCard key={finding.key} {...common} finding={finding} number={null}>
                {may && (
                  <ReopenFinding club={slug} finding={{ key: finding.key, text: finding.text }} reopen={reopen} />
                )}
              </FindingCard>
            ))}
          </ul>
        </Section>
      )}
    </>
  );
}
