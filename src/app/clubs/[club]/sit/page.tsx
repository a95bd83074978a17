import { listHunters } from '@/features/ground/data';
import { readAsk } from '@/features/sits/ask-schema';
import { SitScreen } from '@/features/sits/components/sit-screen';
import { readKeptSits } from '@/features/sits/kept-reads';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { bookSitAction, changeSitAction } from './actions';

export const metadata = { title: 'Sit' };

export default clubPage('sits.read', async ({ scope, search }) => {
  const ask = readAsk(search);
  const initial = await readKeptSits(scope, ask, now());
  const hunters = scope.can('sits.book_for_others') ? await listHunters(scope) : null;
  const { day, window } = initial.window;
  return (
    <SitScreen
      key={`${day} ${window}`}
      ask={{ ...ask, day, window }}
      initial={initial}
      openStandId={typeof search.stand === 'string' ? search.stand : null}
      actions={{ book: bookSitAction, change: changeSitAction }}
      hunters={hunters?.filter((one) => one.id !== scope.member.id).map(({ id, name }) => ({ id, name })) ?? null}
      may={{ book: scope.can('sits.book'), addStands: scope.can('stands.write') }}
    />
  );
});
