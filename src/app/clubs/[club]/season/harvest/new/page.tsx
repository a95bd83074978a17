import { HarvestFormView } from '@/features/harvest/components/harvest-form';
import { readNewHarvest } from '@/features/harvest/sheet-reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { addHarvestAction, changeHarvestAction } from '../actions';

export const metadata = { title: 'New harvest sheet' };

export default clubPage('harvest.write', async ({ scope, search }) => {
  const sit = typeof search.sit === 'string' ? search.sit : null;
  const { form, choices } = await readNewHarvest(scope, sit, now());
  return (
    <>
      <PageTitle
        over={scope.club.name}
        title="New harvest sheet"
        lead="For the club's own record. Tag and report the deer as state law asks."
      />
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
