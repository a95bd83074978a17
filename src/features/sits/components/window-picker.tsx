'use client';

import { useRouter } from 'next/navigation';
import { addDays, formatDay } from '@/core/day-time';
import { type Weapon, WINDOW_NAMES, type WindowName } from '@/core/types';
import { ButtonLink, buttonClasses } from '@/ui/button';
import { DateInput, Select } from '@/ui/text-inputs';
import { inAskedYears } from '../asked-years';
import { keepWeapon } from '../remember';
import { sitAddress } from '../sit-address';
import type { SitsView } from '../view-types';
import { WEAPON_LABELS, WINDOW_WORDS } from '../words';

interface Step {
  day: string;
  window: WindowName;
}

function before({ day, window }: Step): Step {
  return window === 'evening' ? { day, window: 'morning' } : { day: addDays(day, -1), window: 'evening' };
}

function after({ day, window }: Step): Step {
  return window === 'morning' ? { day, window: 'evening' } : { day: addDays(day, 1), window: 'morning' };
}

const label = ({ day, window }: Step) => `${formatDay(day)}, ${WINDOW_WORDS[window]}`;

const addressOf = (view: SitsView, step: Step, weapon: Weapon | null = view.weapon) =>
  sitAddress(view.club.slug, { day: step.day, window: step.window, ...(weapon ? { weapon } : {}) });

/** To the windows before and after. */
export function WindowSteps({ view }: { view: SitsView }) {
  const [earlier, later] = [before(view.window), after(view.window)];
  return (
    <nav aria-label="Windows" className="flex items-stretch justify-between gap-2 print:hidden">
      <ButtonLink look="quiet" href={addressOf(view, earlier)} rel="prev" className="-ml-2 justify-start text-left">
        <span aria-hidden="true">‹</span> {label(earlier)}
      </ButtonLink>
      <ButtonLink look="quiet" href={addressOf(view, later)} rel="next" className="-mr-2 justify-end text-right">
        {label(later)} <span aria-hidden="true">›</span>
      </ButtonLink>
    </nav>
  );
}

/** Day, window and weapon. A plain form, so that it works before its script has come. */
export function ChooseWindow({ view }: { view: SitsView }) {
  const router = useRouter();
  const { window, club, weapon } = view;
  return (
    <form
      method="get"
      action={`/clubs/${club.slug}/sit`}
      aria-label="Day, window and weapon"
      className="mt-2 grid grid-cols-2 items-end gap-3 sm:flex sm:flex-wrap print:hidden"
    >
      <DateInput
        key={window.day}
        label="Day"
        name="day"
        defaultValue={window.day}
        onChange={({ target }) => {
          if (inAskedYears(target.value)) router.push(addressOf(view, { ...window, day: target.value }));
        }}
      />
      <Select
        key={`${window.window}-window`}
        label="Window"
        name="window"
        defaultValue={window.window}
        options={WINDOW_NAMES.map((value) => ({ value, label: WINDOW_WORDS[value] }))}
        onChange={({ target }) => {
          const chosen = WINDOW_NAMES.find((name) => name === target.value);
          if (chosen) router.push(addressOf(view, { ...window, window: chosen }));
        }}
      />
      <Select
        key={`${weapon}-weapon`}
        label="Weapon"
        name="weapon"
        defaultValue={weapon ?? ''}
        fieldClassName="max-sm:col-span-2"
        options={[
          { value: '', label: 'Any weapon' },
          ...view.weapons.map((value) => ({ value, label: WEAPON_LABELS[value] })),
        ]}
        onChange={({ target }) => {
          const chosen = view.weapons.find((one) => one === target.value) ?? null;
          keepWeapon(chosen);
          router.push(addressOf(view, window, chosen));
        }}
      />
      <noscript>
        <button type="submit" className={buttonClasses('plain')}>
          Show
        </button>
      </noscript>
    </form>
  );
}
