import { readStandUpkeep } from '@/features/chores/upkeep-reads';
import { STAND_UPKEEP_WORDS } from '@/features/chores/words/inspections';
import { OpenAgainButton } from '@/features/ground/components/open-again-button';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { Badge, DefinitionList, PageTitle, Section } from '@/ui/page-parts';
import { openAgainAction } from '../../../closures/actions';

const words = STAND_UPKEEP_WORDS;

export const metadata = { title: words.title };

const LOOKS = { pass: 'moss', fix_first: 'plain', closed: 'clay' } as const;

export default clubPage('chores.read', async ({ scope, params }) => {
  const { slug, name } = scope.club;
  const { line, history, closed, closedBy } = await readStandUpkeep(scope, params.stand ?? '', now());
  const passed = line.result === 'pass' && closedBy;
  const inspect = scope.can('inspections.write') && (
    <ButtonLink look="primary" href={`/clubs/${slug}/chores/stands/${line.standId}/inspect`}>
      {words.inspect}
    </ButtonLink>
  );
  return (
    <>
      <PageTitle
        over={name}
        title={words.titleOf(line.name)}
        actions={
          <>
            {inspect}
            <ButtonLink look="quiet" href={`/clubs/${slug}/stands/${line.standId}`}>
              {words.stand}
            </ButtonLink>
          </>
        }
      />
      {closed && (
        <Notice
          level="stop"
          title={words.closed}
          className="mb-6"
          actions={
            passed &&
            scope.can('stands.write') && (
              <OpenAgainButton club={slug} id={closedBy.closureId} what={line.name} openAgain={openAgainAction} />
            )
          }
        >
          {passed ? words.passedText : words.closedText}
        </Notice>
      )}
      <DefinitionList
        items={[
          { term: words.last, detail: line.resultText },
          { term: words.next, detail: line.nextText },
          { term: words.strap, detail: line.strapText },
        ]}
      />
      <Section title={words.history}>
        {history.length === 0 ? (
          <EmptyState title={words.empty} action={inspect}>
            {words.emptyText}
          </EmptyState>
        ) : (
          <ul className="divide-y divide-rule">
            {history.map((one) => (
              <li key={one.id} className="py-4">
                <p className="flex flex-wrap items-center gap-2">
                  <span className="font-semibold font-serif text-lg">{one.dayText}</span>
                  <Badge look={LOOKS[one.result]}>{one.resultText}</Badge>
                  <span className="text-ink-soft">{one.byName}</span>
                </p>
                {one.found.length > 0 && <p>{words.found(one.found)}</p>}
                {one.notes && <p className="max-w-prose whitespace-pre-line">{one.notes}</p>}
              </li>
            ))}
          </ul>
        )}
      </Section>
    </>
  );
});
