import { cookies } from 'next/headers';
import { listHunters } from '@/features/ground/data';
import { readAsk } from '@/features/sits/ask-schema';
import { SitScreen } from '@/features/sits/components/sit-screen';
import { readKeptSits } from '@/features/sits/kept-reads';
import { keptWeapon, WEAPON_COOKIE } from '@/features/sits/remember';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { bookSitAction, changeSitAction } from './actions';

export const metadata = { title: 'Sit' };

export default clubPage('sits.read', async ({ scope, search }) => {
  const asked = readAsk(search);
  const kept = keptWeapon((await cookies()).get(WEAPON_COOKIE)?.value);
  const ask = { ...asked, weapon: asked.weapon ?? kept };
  const initial = await readKeptSits(scope, ask, now());
  const hunters = scope.can('sits.book_for_others') ? await listHunters(scope) : null;
  const { day, window } = initial.window;
  return (
    <SitScreen
      key={`${day} ${window} ${ask.weapon ?? ''}`}
      ask={{ ...ask, day, window }}
      initial={initial}
      openStandId={typeof search.stand === 'string' ? search.stand : null}
      actions={{ book: bookSitAction, change: changeSitAction }}
      hunters={hunters?.filter((one) => one.id !== scope.member.id).map(({ id, name }) => ({ id, name })) ?? null}
      isNext={!asked.day && !asked.window}
      may={{ book: scope.can('sits.book'), addStands: scope.can('stands.write') }}
    />
  );
});
