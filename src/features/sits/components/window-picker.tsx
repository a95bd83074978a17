import { WINDOW_NAMES, type WindowName } from '@/core/condition-types';
import { addDays, formatDay } from '@/core/day-time';
import { ButtonLink, buttonClasses } from '@/ui/button';
import { DateInput, Select } from '@/ui/text-inputs';
import { sitAddress } from '../sit-address';
import type { SitsView } from '../view-types';
import { WINDOW_PICKER_WORDS as WORDS, windowTitle } from '../words/list';
import { WEAPON_LABELS, WINDOW_WORDS } from '../words/names';
import { WindowForm } from './window-form';

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

const title = ({ day, window }: Step) => windowTitle(formatDay(day), window);

const addressOf = ({ club, weapon }: SitsView, { day, window }: Step) =>
  sitAddress(club.slug, { day, window, ...(weapon ? { weapon } : {}) });

/** To the windows before and after. */
export function WindowSteps({ view }: { view: SitsView }) {
  const [earlier, later] = [before(view.window), after(view.window)];
  return (
    <nav aria-label={WORDS.windows} className="flex items-stretch justify-between gap-2 print:hidden">
      <ButtonLink look="quiet" href={addressOf(view, earlier)} rel="prev" className="-ml-2 justify-start text-left">
        <span aria-hidden="true">‹</span> {title(earlier)}
      </ButtonLink>
      <ButtonLink look="quiet" href={addressOf(view, later)} rel="next" className="-mr-2 justify-end text-right">
        {title(later)} <span aria-hidden="true">›</span>
      </ButtonLink>
    </nav>
  );
}

/** Day, window and weapon. */
export function ChooseWindow({ view }: { view: SitsView }) {
  const { window, club, weapon } = view;
  return (
    <WindowForm
      action={`/clubs/${club.slug}/sit`}
      aria-label={WORDS.choose}
      className="mt-2 grid grid-cols-2 items-end gap-3 sm:flex sm:flex-wrap print:hidden"
    >
      <DateInput key={window.day} label={WORDS.day} name="day" defaultValue={window.day} />
      <Select
        key={`${window.window}-window`}
        label={WORDS.window}
        name="window"
        defaultValue={window.window}
        options={WINDOW_NAMES.map((value) => ({ value, label: WINDOW_WORDS[value] }))}
      />
      <Select
        key={`${weapon}-weapon`}
        label={WORDS.weapon}
        name="weapon"
        defaultValue={weapon ?? ''}
        fieldClassName="max-sm:col-span-2"
        options={[
          { value: '', label: WORDS.anyWeapon },
          ...view.weapons.map((value) => ({ value, label: WEAPON_LABELS[value] })),
        ]}
      />
      <noscript>
        <button type="submit" className={buttonClasses('plain')}>
          {WORDS.show}
        </button>
      </noscript>
    </WindowForm>
  );
}
