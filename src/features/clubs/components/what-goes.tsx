import type { RemovalPlan } from '../removal';
import { WHAT_GOES_WORDS } from '../words/members';

function SitList({ sits }: { sits: string[] }) {
  return (
    <ul className="list-disc pl-5">
      {sits.map((sit) => (
        <li key={sit}>{sit}</li>
      ))}
    </ul>
  );
}

/** What happens when a person goes, said before it does. */
export function WhatGoes({ plan }: { plan: RemovalPlan }) {
  return (
    <div className="flex flex-col gap-3">
      {plan.sits.length === 0 ? (
        <p>{WHAT_GOES_WORDS.noSits(plan.name)}</p>
      ) : (
        <div>
          <p>{WHAT_GOES_WORDS.sits(plan.sits.length)}</p>
          <SitList sits={plan.sits} />
        </div>
      )}
      {plan.guests.map((guest) => (
        <div key={guest.name}>
          <p>{WHAT_GOES_WORDS.guest(guest.name, plan.name, guest.sits.length)}</p>
          <SitList sits={guest.sits} />
        </div>
      ))}
      {plan.invitations.length > 0 && <p>{WHAT_GOES_WORDS.invitations(plan.invitations)}</p>}
      <p>{WHAT_GOES_WORDS.stays}</p>
    </div>
  );
}
