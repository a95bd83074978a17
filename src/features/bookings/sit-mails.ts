import { weaponWord } from '@/core/booking/seasons';
import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail } from '@/features/mail/compose';
import { queueMail } from '@/server/outbox';
import type { ClubScope } from '@/server/scope';
import type { SitDetail } from './data';
import { sitCalendar } from './sit-calendar';
import { fullEntry, wayInText } from './sit-entry';
import { dayAndWindow, spanText, zoneText } from './sit-words';
import { SIT_MAIL_WORDS } from './words/mails';

export type SitMail = 'booked' | 'changed' | 'cancelled' | 'lapsed';

/** 'Windrest <windrest@localhost>' is the address inside the brackets. */
function senderAddress(): string {
  return /<([^>]+)>/.exec(env.mailFrom)?.[1] ?? env.mailFrom;
}

function opening(scope: ClubScope, kind: SitMail, sit: SitDetail): string {
  const by = sit.memberId === scope.member.id ? null : scope.member.name;
  if (kind === 'lapsed') return SIT_MAIL_WORDS.lapsed(sit.standName, scope.club.rules.holdMinutes ?? 0);
  if (kind === 'cancelled') return SIT_MAIL_WORDS.cancelled(by, sit.standName, sit.cancelReason);
  return SIT_MAIL_WORDS[kind](by, sit.standName);
}

/** Whoever reads the mail has units of their own, which whoever caused it need not share. */
const readersClub = ({ club }: ClubScope, sit: SitDetail) => ({ ...club, units: sit.memberUnits ?? club.clubUnits });

function facts(scope: ClubScope, sit: SitDetail): { label: string; value: string }[] {
  const way = wayInText(sit);
  const span = spanText(sit.startAt, sit.endAt, readersClub(scope, sit));
  return [
    { label: SIT_MAIL_WORDS.stand, value: sit.standName },
    { label: SIT_MAIL_WORDS.when, value: dayAndWindow(sit.day, sit.windows, true) },
    { label: SIT_MAIL_WORDS.clubTime, value: `${span} (${zoneText(scope.club.zone)})` },
    { label: SIT_MAIL_WORDS.weapon, value: weaponWord(sit.weapon) },
    ...(way === null ? [] : [{ label: SIT_MAIL_WORDS.wayIn, value: way }]),
    ...(sit.guests.length === 0
      ? []
      : [{ label: SIT_MAIL_WORDS.guests, value: sit.guests.map((guest) => guest.name).join(', ') }]),
    ...(sit.note === '' ? [] : [{ label: SIT_MAIL_WORDS.note, value: sit.note }]),
  ];
}

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
    button: { label: SIT_MAIL_WORDS.button, url: `${env.appUrl}/clubs/${club.slug}/my-sits` },
    footer: SIT_MAIL_WORDS.footer,
  });
  await queueMail(
    tx,
    {
      clubId: club.id,
      kind: `sit.${kind}`,
      dedupeKey: `sit.${kind}:${sit.id}:${sit.sequence}`,
      to,
      subject: SIT_MAIL_WORDS.subjects[kind](sit.standName, dayAndWindow(sit.day, sit.windows)),
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
