'use client';

import { useId, useState } from 'react';
import { Button, ButtonLink } from '@/ui/button';
import type { SitsView } from '../view-types';
import { AlmanacHead, AlmanacLine } from './almanac-head';
import { ChooseWindow, WindowSteps } from './window-picker';

/** Day, window, weapon and the almanac. A phone shows a line of it and keeps the rest folded, so that the list comes first. */
export function SitHead({ view }: { view: SitsView }) {
  const [unfolded, setUnfolded] = useState(false);
  const id = useId();
  return (
    <>
      <WindowSteps view={view} />
      <AlmanacLine view={view} />
      <div className="flex justify-between sm:hidden print:hidden">
        <Button
          look="quiet"
          className="-ml-2"
          aria-expanded={unfolded}
          aria-controls={id}
          onClick={() => setUnfolded(!unfolded)}
        >
          {unfolded ? 'Fold' : 'Day, weapon, moon'}
        </Button>
        <ButtonLink look="quiet" className="-mr-2" href={`/clubs/${view.club.slug}/week`}>
          The whole week
        </ButtonLink>
      </div>
      <div id={id} className={unfolded ? undefined : 'max-sm:hidden'}>
        <ChooseWindow view={view} />
        <AlmanacHead view={view} />
      </div>
    </>
  );
}
