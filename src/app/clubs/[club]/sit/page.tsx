import { cookies } from 'next/headers';
import { listHunters } from '@/features/ground/data';
import { LateFirstSteps } from '@/features/onboarding/components/late-first-steps';
import { readFirstSteps } from '@/features/onboarding/read-first-steps';
import { readAsk } from '@/features/sits/ask-schema';
import { SitScreen } from '@/features/sits/components/sit-screen';
import { readKeptSits } from '@/features/sits/kept-reads';
import { keptWeapon, WEAPON_COOKIE } from '@/features/sits/remember';
import { SIT_PAGE_WORDS } from '@/features/sits/words/list';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { hideFirstStepsAction, laySamplesAction, removeSamplesAction } from '../first-steps/actions';
import { bookSitAction, changeSitAction } from './actions';

const FIRST_STEPS = { lay: laySamplesAction, remove: removeSamplesAction, hide: hideFirstStepsAction };

export const metadata = { title: SIT_PAGE_WORDS.title };

export default clubPage('sits.read', async ({ scope, search }) => {
  const asked = readAsk(search);
  const kept = keptWeapon((await cookies()).get(WEAPON_COOKIE)?.value);
  const ask = { ...asked, weapon: asked.weapon ?? kept };
  const view = await readKeptSits(scope, ask, now());
  const hunters = scope.can('sits.book_for_others') ? await listHunters(scope) : null;
  const first = await readFirstSteps(scope);
  const { day, window } = view.window;
  return (
    <>
      {first && <LateFirstSteps club={scope.club.slug} first={first} actions={FIRST_STEPS} />}
      <SitScreen
        key={`${day} ${window} ${ask.weapon ?? ''}`}
        ask={{ ...ask, day, window }}
        view={view}
        openStandId={typeof search.stand === 'string' ? search.stand : null}
        actions={{ book: bookSitAction, change: changeSitAction }}
        hunters={hunters?.filter((one) => one.id !== scope.member.id).map(({ id, name }) => ({ id, name })) ?? null}
        isNext={!asked.day && !asked.window}
        may={{ book: scope.can('sits.book'), addStands: scope.can('stands.write') }}
      />
    </>
  );
});
