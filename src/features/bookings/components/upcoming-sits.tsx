'use client';

import { DefinitionList } from '@/ui/page-parts';
import type { SitOptions } from '../reads';
import type { SitView } from '../sit-view';
import { UPCOMING_SITS_WORDS } from '../words/screens';
import { CancelSitButton } from './cancel-sit-button';
import type { CancelAction } from './cancel-sit-dialog';
import { type ChangeAction, ChangeSitDialog, type SeasonTexts } from './change-sit-dialog';

interface UpcomingSitsProps {
  club: string;
  sits: SitView[];
  options: SitOptions;
  /** Quotas that are met, by season. */
  quotas: SeasonTexts[];
  change: ChangeAction;
  cancel: CancelAction;
}

function factsOf(sit: SitView) {
  return [
    { term: UPCOMING_SITS_WORDS.when, detail: sit.whenText },
    { term: UPCOMING_SITS_WORDS.clubTime, detail: sit.timeText },
    { term: UPCOMING_SITS_WORDS.weapon, detail: sit.weaponText },
    ...(sit.wayIn ? [{ term: UPCOMING_SITS_WORDS.wayIn, detail: sit.wayIn }] : []),
    ...(sit.guests.length > 0
      ? [{ term: UPCOMING_SITS_WORDS.guests, detail: sit.guests.map((guest) => guest.name).join(', ') }]
      : []),
    ...(sit.note ? [{ term: UPCOMING_SITS_WORDS.note, detail: sit.note }] : []),
  ];
}

export function UpcomingSits({ club, sits, options, quotas, change, cancel }: UpcomingSitsProps) {
  return (
    <ul className="flex flex-col gap-8">
      {sits.map((sit) => (
        <li key={sit.id} aria-label={`${sit.standName}, ${sit.whenText}`}>
          <h3 className="mb-2 font-serif text-lg">{sit.standName}</h3>
          <DefinitionList items={factsOf(sit)} />
          <div className="mt-3 flex flex-wrap gap-2">
            {/* A new key after each change: the form must start from what is saved. */}
            <ChangeSitDialog
              key={sit.sequence}
              club={club}
              change={change}
              sit={sit}
              options={options}
              quotas={quotas}
            />
            <CancelSitButton club={club} cancel={cancel} sit={sit} />
          </div>
        </li>
      ))}
    </ul>
  );
}
