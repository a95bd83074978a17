import { isDeepStrictEqual } from 'node:util';
import type { Tx } from '@/db/client';
import { env } from '@/env';
import { composeMail } from '@/features/mail/compose';
import { queueMail } from '@/server/outbox';
import type { ClubScope } from '@/server/scope';
import type { SitDetail } from './data';
import { type GuestReader, listGuestReaders } from './readers-data';
import { type SitMail, sitEntry, sitFacts } from './sit-mails';
import { GUEST_MAIL_WORDS } from './words/mails';
import { dayAndWindow } from './words/sits';

/** left_out: the sit stands, without this guest. */
type GuestMail = SitMail | 'left_out';

const SHOWN = ['standId', 'day', 'windows', 'weapon', 'approachId'] as const;

const accountsOf = (sit: Pick<SitDetail, 'guests'> | null) =>
  sit?.guests.flatMap(({ memberId }) => memberId ?? []) ?? [];

/** What each guest with an account is told. `before`: the sit as it was; null: it is new. */
function tellings(kind: SitMail, sit: SitDetail, before: SitDetail | null): Map<string, GuestMail> {
  const told = new Map<string, GuestMail>();
  if (kind !== 'changed' || !before) {
    for (const id of accountsOf(sit)) told.set(id, kind);
    return told;
  }
  const stays = SHOWN.every((name) => isDeepStrictEqual(sit[name], before[name]));
  const [now, then] = [accountsOf(sit), accountsOf(before)];
  for (const id of now) {
    if (!then.includes(id)) told.set(id, 'booked');
    else if (!stays) told.set(id, 'changed');
  }
  for (const id of then) if (!now.includes(id)) told.set(id, 'left_out');
  return told;
}

function opening(scope: ClubScope, kind: GuestMail, sit: SitDetail): string {
  const words = GUEST_MAIL_WORDS;
  const about = { by: scope.member.name, host: sit.memberName, stand: sit.standName };
  if (kind === 'lapsed') return words.lapsed(about, scope.club.rules.holdMinutes ?? 0);
  return kind === 'cancelled' ? words.cancelled(about, sit.cancelReason) : words[kind](about);
}

/** The note is between the host and whoever books for them. */
async function queueOne(tx: Tx, scope: ClubScope, kind: GuestMail, sit: SitDetail, to: GuestReader, now: number) {
  const { club } = scope;
  const words = GUEST_MAIL_WORDS;
  const { text, html } = composeMail({
    clubName: club.name,
    paragraphs: [opening(scope, kind, sit)],
    facts: [{ label: words.host, value: sit.memberName }, ...sitFacts(scope, sit, to.units)],
    button: { label: words.button, url: `${env.appUrl}/clubs/${club.slug}/board` },
    footer: words.footer(sit.memberName),
  });
  const reader = { name: to.name, email: to.email };
  await queueMail(
    tx,
    {
      clubId: club.id,
      kind: `sit.guest_${kind}`,
      dedupeKey: `sit.guest_${kind}:${sit.id}:${sit.sequence}:${to.id}`,
      to: reader,
      subject: words.subjects[kind](sit.standName, dayAndWindow(sit.day, sit.windows)),
      text,
      html,
      calendar: sitEntry(scope, { ...sit, note: '', ...(kind === 'left_out' ? { status: 'cancelled' } : {}) }, reader),
    },
    now,
  );
}

/** Tells the guests of a sit who have an account, each by what becomes of the sit for them. */
export async function queueGuestMails(
  tx: Tx,
  scope: ClubScope,
  kind: SitMail,
  sit: SitDetail,
  before: SitDetail | null,
  now: number,
): Promise<void> {
  const told = tellings(kind, sit, before);
  for (const reader of await listGuestReaders(scope, [...told.keys()], tx)) {
    const mail = told.get(reader.id);
    if (mail) await queueOne(tx, scope, mail, sit, reader, now);
  }
}
