import { weaponWord } from '@/core/booking/seasons';
import type { Units } from '@/core/units';
import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail } from '@/features/mail/compose';
import { queueMail } from '@/server/outbox';
import type { ClubScope } from '@/server/scope';
import type { SitDetail } from './data';
import { sitCalendar } from './sit-calendar';
import { fullEntry, wayInText } from './sit-entry';
import { SIT_MAIL_WORDS } from './words/mails';
import { dayAndWindow, spanText, zoneText } from './words/sits';

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
export const readersClub = ({ club }: ClubScope, units: Units | null) => ({ ...club, units: units ?? club.clubUnits });

/** What a mail of a sit says of it, whoever reads it. */
export function sitFacts(scope: ClubScope, sit: SitDetail, units: Units | null): { label: string; value: string }[] {
  const way = wayInText(sit);
  const span = spanText(sit.startAt, sit.endAt, readersClub(scope, units));
  return [
    { label: SIT_MAIL_WORDS.stand, value: sit.standName },
    { label: SIT_MAIL_WORDS.when, value: dayAndWindow(sit.day, sit.windows, true) },
    { label: SIT_MAIL_WORDS.clubTime, value: `${span} (${zoneText(scope.club.zone)})` },
    { label: SIT_MAIL_WORDS.weapon, value: weaponWord(sit.weapon) },
    ...(way === null ? [] : [{ label: SIT_MAIL_WORDS.wayIn, value: way }]),
    ...(sit.guests.length === 0
      ? []
      : [{ label: SIT_MAIL_WORDS.guests, value: sit.guests.map((guest) => guest.name).join(', ') }]),
  ];
}

/** The entry for the calendar of whoever is told: taken out of it where the sit no longer stands for them. */
export function sitEntry(scope: ClubScope, sit: SitDetail, attendee: { name: string; email: string }) {
  const { club } = scope;
  const method = sit.status === 'booked' ? ('REQUEST' as const) : ('CANCEL' as const);
  const organizer = { name: club.name, email: senderAddress() };
  const entries = [{ sit, shown: fullEntry(sit, club, false), organizer, attendee }];
  return { method, content: sitCalendar({ name: club.name, method, entries }) };
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
  const { text, html } = composeMail({
    clubName: club.name,
    paragraphs: [opening(scope, kind, sit)],
    facts: [
      ...sitFacts(scope, sit, sit.memberUnits),
      ...(sit.note === '' ? [] : [{ label: SIT_MAIL_WORDS.note, value: sit.note }]),
    ],
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
      calendar: sitEntry(scope, sit, to),
    },
    now,
  );
}
