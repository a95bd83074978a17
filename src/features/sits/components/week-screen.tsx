import { ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle } from '@/ui/page-parts';
import { Select } from '@/ui/text-inputs';
import type { WeekAskText } from '../ask-schema';
import { weekAddress } from '../read-addresses';
import type { KeptWeekView } from '../view-types';
import { WEEK_SHOWS } from '../week-cells';
import { WEAPON_LABELS } from '../words/names';
import { OLD_LIST_WORDS } from '../words/rows';
import { WEEK_SHOW_LABELS, WEEK_PAGE_WORDS as WORDS } from '../words/week';
import { ForecastNote } from './forecast-note';
import { LookAgain } from './look-again';
import { WeekRows } from './week-rows';

export function WeekScreen({ ask, view }: { ask: WeekAskText; view: KeptWeekView }) {
  const { slug } = view.club;
  return (
    <>
      <PageTitle
        over={<span className="max-sm:hidden">{view.club.name}</span>}
        title={WORDS.title}
        lead={WORDS.lead}
        actions={
          <ButtonLink look="quiet" href={`/clubs/${slug}/sit`}>
            {WORDS.nextWindow}
          </ButtonLink>
        }
      />
      <WeekRows view={view} choices={<WeekChoices view={view} />}>
        <ForecastNote forecast={view.forecast} now={view.madeAt} />
        <LookAgain
          address={weekAddress(slug, ask)}
          mark={view.mark}
          madeAt={view.madeAt}
          old={
            <Notice level="caution" live title={OLD_LIST_WORDS.weekTitle}>
              {OLD_LIST_WORDS.text}
            </Notice>
          }
        />
        {view.cautions.map((caution) => (
          <Notice key={caution.text} level="caution" title={caution.text} />
        ))}
      </WeekRows>
      {view.stands.length === 0 && (
        <div className="mt-6">
          <EmptyState title={WORDS.noStandsTitle}>{WORDS.noStands}</EmptyState>
        </div>
      )}
    </>
  );
}

function WeekChoices({ view }: { view: KeptWeekView }) {
  return (
    <>
      <Select
        label={WORDS.show}
        name="show"
        options={WEEK_SHOWS.map((value) => ({ value, label: WEEK_SHOW_LABELS[value] }))}
      />
      <Select
        key={view.weapon}
        label={WORDS.weapon}
        name="weapon"
        defaultValue={view.weapon ?? ''}
        options={[
          { value: '', label: WORDS.anyWeapon },
          ...view.weapons.map((value) => ({ value, label: WEAPON_LABELS[value] })),
        ]}
      />
    </>
  );
}
