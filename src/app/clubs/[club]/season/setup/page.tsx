import { chooseFindings } from '@/features/setup/choose-findings';
import { AnswerFinding, ReopenFinding } from '@/features/setup/components/answer-dialogs';
import { FindingCard } from '@/features/setup/components/finding-card';
import { FindingsMap } from '@/features/setup/components/findings-map';
import { readSetup } from '@/features/setup/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { Button, ButtonLink, TextLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { Select } from '@/ui/text-inputs';
import { acceptFindingAction, dismissFindingAction, reopenFindingAction } from './actions';

export const metadata = { title: 'Set-up check' };

export default clubPage('features.read', async ({ scope, search }) => {
  const { slug, name } = scope.club;
  const { open: all, answered, windsFrom, counts } = await readSetup(scope, now());
  const chosen = chooseFindings(all, search);
  const { open } = chosen;
  const may = scope.can('features.write');
  const common = { club: slug, mayOpenChores: scope.can('chores.read') };
  return (
    <>
      <PageTitle
        over={name}
        title="Set-up check"
        lead="What draws deer should draw them past the shot, and nowhere near the walk. Here is where it does not."
      />
      <Notice title="Ask before you cut, dig or bait" className="mb-6">
        Mock scrapes, water, bait and cutting may be limited by the state or the landowner. Nothing here says that a
        piece of work is allowed.
      </Notice>
      {counts.stands === 0 || counts.features === 0 ? (
        <EmptyState
          title="Nothing to check yet"
          action={<ButtonLink href={`/clubs/${slug}/ground`}>Go to the ground</ButtonLink>}
        >
          Draw stands, ways in and what deer use first.
        </EmptyState>
      ) : (
        <Section
          title={open.length === 1 ? 'One finding' : `${open.length} findings`}
          note={`${windsFrom ? `Usual winds: ${windsFrom}.` : 'No season of hours is known: every wind counts the same.'} All rules are practice.${
            counts.camerasBlind > 0
              ? ` ${counts.camerasBlind} of ${counts.cameras} cameras have no direction written down and are not checked.`
              : ''
          }`}
        >
          {all.length === 0 ? (
            <EmptyState title="Nothing found">
              Every attraction is in shot on some wind, the walks keep clear, and nobody looks into the sun.
            </EmptyState>
          ) : (
            <>
              <form method="get" className="mb-4 flex flex-wrap items-end gap-4">
                <Select label="Stand" name="stand" defaultValue={chosen.stand} options={chosen.stands} />
                <Select label="What" name="what" defaultValue={chosen.what} options={chosen.kinds} />
                <Button type="submit">Show</Button>
              </form>
              <FindingsMap club={slug} findings={open.map(({ at }) => ({ at }))} />
              {open.length === 0 && <p className="mt-4 text-ink-soft">Nothing of this kind at this stand.</p>}
              <ol className="mt-4">
                {open.map((finding, index) => (
                  <FindingCard key={finding.key} {...common} finding={finding} number={index + 1}>
                    {may && (
                      <AnswerFinding
                        club={slug}
                        finding={{ key: finding.key, print: finding.print, text: finding.text, acts: finding.acts }}
                        accept={acceptFindingAction}
                        dismiss={dismissFindingAction}
                      />
                    )}
                  </FindingCard>
                ))}
              </ol>
            </>
          )}
        </Section>
      )}
      {answered.length > 0 && (
        <Section title="Answered" note="They come back when the ground they rest on changes.">
          <ul>
            {answered.map((finding) => (
              <FindingCard key={finding.key} {...common} finding={finding} number={null}>
                {may && (
                  <ReopenFinding
                    club={slug}
                    finding={{ key: finding.key, text: finding.text }}
                    reopen={reopenFindingAction}
                  />
                )}
              </FindingCard>
            ))}
          </ul>
        </Section>
      )}
      <p className="mt-8 text-ink-soft text-sm">
        Stands and features are changed on the <TextLink href={`/clubs/${slug}/ground`}>ground</TextLink>.
      </p>
    </>
  );
});
