import { readStandUpkeep } from '@/features/chores/reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { Badge, DefinitionList, PageTitle, Section } from '@/ui/page-parts';

export const metadata = { title: 'Inspections' };

const LOOKS = { pass: 'moss', fix_first: 'plain', closed: 'clay' } as const;

export default clubPage('chores.read', async ({ scope, params }) => {
  const { slug, name } = scope.club;
  const { line, history } = await readStandUpkeep(scope, params.stand ?? '', now());
  const inspect = scope.can('inspections.write') && (
    <ButtonLink look="primary" href={`/clubs/${slug}/chores/stands/${line.standId}/inspect`}>
      Inspect it now
    </ButtonLink>
  );
  return (
    <>
      <PageTitle
        over={name}
        title={`Inspections of ${line.name}`}
        actions={
          <>
            {inspect}
            <ButtonLink look="quiet" href={`/clubs/${slug}/stands/${line.standId}`}>
              The stand
            </ButtonLink>
          </>
        }
      />
      {history.some((one) => one.closureOpen) && (
        <Notice level="stop" title="Closed by an inspection" className="mb-6">
          It stays closed until a steward opens it again under Closed days.
        </Notice>
      )}
      <DefinitionList
        items={[
          { term: 'Last result', detail: line.resultText },
          { term: 'Next look due', detail: line.nextText },
          { term: 'Main strap', detail: line.strapText },
        ]}
      />
      <Section title="History">
        {history.length === 0 ? (
          <EmptyState title="Nobody has looked it over yet" action={inspect}>
            The list takes some ten minutes at the stand.
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
                {one.found.length > 0 && (
                  <p>{one.found.map(({ label, answer }) => `${label}: ${answer.toLowerCase()}`).join('; ')}</p>
                )}
                {one.notes && <p className="max-w-prose whitespace-pre-line">{one.notes}</p>}
              </li>
            ))}
          </ul>
        )}
      </Section>
    </>
  );
});
