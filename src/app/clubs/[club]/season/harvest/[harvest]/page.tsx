import { RemoveButton } from '@/features/ground/components/remove-button';
import { HarvestFormView } from '@/features/harvest/components/harvest-form';
import { readHarvestSheet } from '@/features/harvest/sheet-reads';
import { clubPage } from '@/server/doors';
import { DefinitionList, PageTitle, Section } from '@/ui/page-parts';
import { addHarvestAction, changeHarvestAction, removeHarvestAction } from '../actions';

export const metadata = { title: 'Harvest sheet' };

export default clubPage('harvest.read', async ({ scope, params }) => {
  const { slug, name } = scope.club;
  const { id, version, title, facts, change } = await readHarvestSheet(scope, params.harvest ?? '');
  return (
    <>
      <PageTitle
        over={name}
        title={title}
        actions={
          change && (
            <RemoveButton
              club={slug}
              at={{ id, version }}
              name="this sheet"
              remove={removeHarvestAction}
              to={`/clubs/${slug}/season/harvest`}
            >
              <p>The deer no longer counts toward any quota. The audit log keeps that it was written.</p>
            </RemoveButton>
          )
        }
      />
      <DefinitionList
        className="max-w-2xl"
        items={facts.map(({ term, detail }) => ({
          term,
          detail: <span className="whitespace-pre-line">{detail}</span>,
        }))}
      />
      {change && (
        <Section title="Change the sheet" className="mt-10">
          <HarvestFormView
            key={version}
            club={slug}
            values={change.form}
            choices={change.choices}
            at={{ id, version }}
            add={addHarvestAction}
            change={changeHarvestAction}
          />
        </Section>
      )}
    </>
  );
});
