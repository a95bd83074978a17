import { RemoveButton } from '@/features/ground/components/remove-button';
import { HarvestFormView } from '@/features/harvest/components/harvest-form';
import { readHarvestSheet } from '@/features/harvest/sheet-reads';
import { SHEET_WORDS } from '@/features/harvest/words/sheet';
import { clubPage } from '@/server/doors';
import { DefinitionList, PageTitle, Section } from '@/ui/page-parts';
import { addHarvestAction, changeHarvestAction, removeHarvestAction } from '../actions';

const words = SHEET_WORDS;

export const metadata = { title: words.title };

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
              name={words.thisSheet}
              remove={removeHarvestAction}
              to={`/clubs/${slug}/season/harvest`}
            >
              <p>{words.removeText}</p>
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
        <Section title={words.change} className="mt-10">
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
