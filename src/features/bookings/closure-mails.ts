import { formatDay } from '@/core/day-time';
import type { Tx } from '@/db/client';
import { env } from '@/env';
import type { ClosureValues } from '@/features/ground/closures-data';
import { composeMail, type MailParts } from '@/features/mail/compose';
import { queueMail } from '@/server/outbox';
import type { ClubScope } from '@/server/scope';
import { listBookedSits, type SitDetail } from './data';
import { listOfficers } from './readers-data';
import { CLOSED_MAIL_WORDS as WORDS } from './words/mails';
import { dayAndWindow } from './words/sits';

interface Closure extends ClosureValues {
  id: string;
  /** 'Oak Ladder' or 'the whole ground'. */
  name: string;
}

interface Reader {
  role: 'member' | 'officer';
  memberId: string;
  name: string;
  email: string;
}

const LAST_DAY = '9999-12-31';
/** The page of closed days lists the rest. */
const MOST_LISTED = 30;

async function listTouched(tx: Tx, scope: ClubScope, closure: Closure, now: number): Promise<SitDetail[]> {
  const { fromDay, toDay, standId } = closure;
  const booked = await listBookedSits(scope, { fromDay, toDay: toDay ?? LAST_DAY }, tx);
  return booked.filter((sit) => sit.endAt > now && (standId === null || sit.standId === standId));
}

const daysOf = ({ fromDay, toDay }: Closure) =>
  WORDS.days(formatDay(fromDay, true), toDay === null ? null : formatDay(toDay, true), fromDay === toDay);

type Parts = Omit<MailParts, 'clubName'>;

function send(tx: Tx, scope: ClubScope, closure: Closure, as: Reader, parts: Parts, now: number) {
  const { club } = scope;
  const { text, html } = composeMail({ ...parts, clubName: club.name });
  const kind = `days.closed_${as.role}`;
  const dedupeKey = `${kind}:${closure.id}:${as.memberId}`;
  const to = { name: as.name, email: as.email };
  const subject = WORDS.subject(closure.name, daysOf(closure));
  return queueMail(tx, { clubId: club.id, kind, dedupeKey, to, subject, text, html }, now);
}

const factsOf = (closure: Closure) => [
  { label: WORDS.closed, value: closure.name },
  { label: WORDS.when, value: daysOf(closure) },
  { label: WORDS.why, value: closure.reason },
];

const sitText = (sit: SitDetail) => WORDS.sitOf(sit.standName, dayAndWindow(sit.day, sit.windows, true));

function memberParts(scope: ClubScope, closure: Closure, own: SitDetail[]): Parts {
  return {
    paragraphs: [WORDS.opening(scope.member.name, closure.name, own.length)],
    facts: [...factsOf(closure), ...own.map((sit) => ({ label: WORDS.sit, value: sitText(sit) }))],
    button: { label: WORDS.button, url: `${env.appUrl}/clubs/${scope.club.slug}/my-sits` },
    after: [WORDS.after],
    footer: WORDS.footer,
  };
}

function officerParts(scope: ClubScope, closure: Closure, touched: SitDetail[]): Parts {
  const listed = touched.slice(0, MOST_LISTED).map((sit) => ({ label: sit.memberName, value: sitText(sit) }));
  return {
    paragraphs: [WORDS.officerOpening(scope.member.name, closure.name, touched.length)],
    facts: [...factsOf(closure), ...listed],
    button: { label: WORDS.officerButton, url: `${env.appUrl}/clubs/${scope.club.slug}/closures` },
    footer: WORDS.officerFooter(scope.club.name),
  };
}

/**
 * Tells each member once whose booked sits a closure falls on, and each officer once which these are; whoever closes knows.
 * The sits stay booked.
 */
export async function queueClosureMails(tx: Tx, scope: ClubScope, closure: Closure, now: number): Promise<void> {
  const touched = await listTouched(tx, scope, closure, now);
  if (touched.length === 0) return;
  const me = scope.member.id;
  for (const memberId of new Set(touched.map((sit) => sit.memberId))) {
    const own = touched.filter((sit) => sit.memberId === memberId);
    const [first] = own;
    if (!first || memberId === me) continue;
    const as = { role: 'member', memberId, name: first.memberName, email: first.memberEmail } as const;
    await send(tx, scope, closure, as, memberParts(scope, closure, own), now);
  }
  for (const officer of await listOfficers(scope, tx)) {
    if (officer.memberId === me) continue;
    await send(tx, scope, closure, { role: 'officer', ...officer }, officerParts(scope, closure, touched), now);
  }
}
