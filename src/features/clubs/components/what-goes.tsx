import type { RemovalPlan } from '../removal';

const sitsWord = (count: number) => (count === 1 ? 'One booked sit is' : `${count} booked sits are`);

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
        <p>No sit of {plan.name} is booked ahead.</p>
      ) : (
        <div>
          <p>{sitsWord(plan.sits.length)} cancelled, and a mail tells of each. The stands are free for others:</p>
          <SitList sits={plan.sits} />
        </div>
      )}
      {plan.guests.map((guest) => (
        <div key={guest.name}>
          <p>
            {guest.name}, a guest of {plan.name}, is taken out too.
            {guest.sits.length > 0 && ` ${sitsWord(guest.sits.length)} cancelled:`}
          </p>
          <SitList sits={guest.sits} />
        </div>
      ))}
      {plan.invitations.length > 0 && <p>Open invitations are revoked: {plan.invitations.join(', ')}.</p>}
      <p>Past sits and the audit log stay as they are. Calendar addresses stop working.</p>
    </div>
  );
}
