import { HarvestFormView } from '@/features/harvest/components/harvest-form';
import { readNewHarvest } from '@/features/harvest/sheet-reads';
import { NEW_SHEET_WORDS } from '@/features/harvest/words/sheet';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addHarvestAction, changeHarvestAction } from '../actions';

export const metadata = { title: NEW_SHEET_WORDS.title };

export default clubPage('harvest.write', async ({ scope, search }) => {
  const sit = typeof search.sit === 'string' ? search.sit : null;
  const { form, choices } = await readNewHarvest(scope, sit, now());
  return (
    <>
      <PageTitle over={scope.club.name} title={NEW_SHEET_WORDS.title} lead={NEW_SHEET_WORDS.lead} />
      <HarvestFormView
        club={scope.club.slug}
        values={form}
        choices={choices}
        at={null}
        add={addHarvestAction}
        change={changeHarvestAction}
      />
    </>
  );
});
