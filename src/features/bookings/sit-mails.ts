import { weaponWord } from '@/core/booking/seasons';
import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail } from '@/features/mail/compose';
import { queueMail } from '@/server/outbox';
import type { ClubScope } from '@/server/scope';
import type { SitDetail } from './data';
import { sitCalendar } from './sit-calendar';
import { fullEntry, wayInText } from './sit-entry';
import { dayAndWindow, spanText } from './sit-words';

export type SitMail = 'booked' | 'changed' | 'cancelled' | 'lapsed';

/** 'Windrest <windrest@localhost>' is the address inside the brackets. */
function senderAddress(): string {
  return /<([^>]+)>/.exec(env.mailFrom)?.[1] ?? env.mailFrom;
}

function opening(scope: ClubScope, kind: SitMail, sit: SitDetail): string {
  const own = sit.memberId === scope.member.id;
  const who = own ? 'You' : scope.member.name;
  if (kind === 'booked') return own ? `You booked ${sit.standName}.` : `${who} booked ${sit.standName} for you.`;
  if (kind === 'changed') return `${who} changed your sit. This is how it stands now.`;
  if (kind === 'lapsed') {
    const minutes = scope.club.rules.holdMinutes ?? 0;
    return `Your sit at ${sit.standName} has lapsed: nobody signed in within ${minutes} minutes. The stand is free again.`;
  }
  const reason = sit.cancelReason ? ` The reason given: ${sit.cancelReason}` : '';
  return `${who} cancelled your sit at ${sit.standName}.${reason}`;
}

function facts(scope: ClubScope, sit: SitDetail): { label: string; value: string }[] {
  const way = wayInText(sit);
  return [
    { label: 'Stand', value: sit.standName },
    { label: 'When', value: dayAndWindow(sit.day, sit.windows, true) },
    { label: 'Club time', value: spanText(sit.startAt, sit.endAt, scope.club) },
    { label: 'Weapon', value: weaponWord(sit.weapon) },
    ...(way === null ? [] : [{ label: 'Way in', value: way }]),
    ...(sit.guests.length === 0 ? [] : [{ label: 'Guests', value: sit.guests.map((guest) => guest.name).join(', ') }]),
    ...(sit.note === '' ? [] : [{ label: 'Note', value: sit.note }]),
  ];
}

const SUBJECTS: Record<SitMail, string> = {
  booked: 'Sit booked',
  changed: 'Sit changed',
  cancelled: 'Sit cancelled',
  lapsed: 'Sit lapsed',
};

/** Tells the member whose sit it is, with an entry for the calendar. */
export async function queueSitMail(
  tx: Tx,
  scope: ClubScope,
  kind: SitMail,
  sit: SitDetail,
  now: number,
): Promise<void> {
  const { club } = scope;
  const to = { email: sit.memberEmail, name: sit.memberName };
  const method = sit.status === 'booked' ? 'REQUEST' : 'CANCEL';
  const organizer = { name: club.name, email: senderAddress() };
  const shown = fullEntry(sit, club, false);
  const { text, html } = composeMail({
    clubName: club.name,
    paragraphs: [opening(scope, kind, sit)],
    facts: facts(scope, sit),
    button: { label: 'Open my sits', url: `${env.appUrl}/clubs/${club.slug}/my-sits` },
    footer: 'You get this because the sit is yours.',
  });
  await queueMail(
    tx,
    {
      clubId: club.id,
      kind: `sit.${kind}`,
      dedupeKey: `sit.${kind}:${sit.id}:${sit.sequence}`,
      to,
      subject: `${SUBJECTS[kind]}: ${sit.standName}, ${dayAndWindow(sit.day, sit.windows)}`,
      text,
      html,
      calendar: {
        method,
        content: sitCalendar({ name: club.name, method, entries: [{ sit, shown, organizer, attendee: to }] }),
      },
    },
    now,
  );
}
