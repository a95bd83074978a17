import { ButtonLink } from '@/ui/button';
import type { SitsView } from '../view-types';
import { SIT_LIST_WORDS } from '../words/list';
import { AlmanacHead, AlmanacLine } from './almanac-head';
import { Fold } from './fold';
import { ChooseWindow, WindowSteps } from './window-picker';

/** Day, window, weapon and the almanac. A phone shows a line of it and keeps the rest folded. */
export function SitHead({ view }: { view: SitsView }) {
  const week = (
    <ButtonLink look="quiet" className="-mr-2" href={`/clubs/${view.club.slug}/week`}>
      {SIT_LIST_WORDS.wholeWeek}
    </ButtonLink>
  );
  return (
    <>
      <WindowSteps view={view} />
      <AlmanacLine view={view} />
      <Fold beside={week}>
        <ChooseWindow view={view} />
        <AlmanacHead view={view} />
      </Fold>
    </>
  );
}
