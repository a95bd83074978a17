import { dueSteps, type OverdueStep, overdueStepTimes } from '@/core/outing/overdue-steps';
import { type Tx, write } from '@/db/client';
import { listOfficers } from '@/features/bookings/readers-data';
import { log } from '@/server/log';
import { type ClubScope, systemScopeById } from '@/server/scope';
import { auditOuting } from './audit-outing';
import { type ContactRow, findContact } from './contacts-data';
import { findOuting, listPastBackBy, type OutingDetail } from './data';
import { insertStep, listSteps, type OverdueStepRow } from './overdue-data';
import { type OverdueReader, queueOverdueMail } from './overdue-mails';
import { contactLink } from './sit-links';
import { clockBeside } from './words/outing';
import { CONTACT_FORECAST, overdueAudit } from './words/overdue';

const stepId = (outing: { id: string; moves: number }, step: OverdueStep) => `${outing.id}:${outing.moves}:${step}`;

type Outcome = OverdueStepRow['outcome'];

function contactOutcome(outing: OutingDetail, contact: ContactRow | null): Outcome {
  if (!contact?.consentedAt) return 'no_consent';
  return contact.off || outing.contactOff ? 'off' : 'mailed';
}

/** What officers need to know of the last step. */
function contactForecast(scope: ClubScope, outing: OutingDetail, contact: ContactRow | null, now: number): string {
  const outcome = contactOutcome(outing, contact);
  if (outcome === 'no_consent') return CONTACT_FORECAST.noConsent;
  if (outcome === 'off') return CONTACT_FORECAST.off;
  const at = overdueStepTimes(outing.backBy, scope.club.rules).find(({ step }) => step === 'contact')?.at ?? now;
  return at <= now ? CONTACT_FORECAST.now : CONTACT_FORECAST.at(clockBeside(at, now, scope.club));
}

interface Telling {
  readers: OverdueReader[];
  outcome: Outcome;
  more: string;
}

async function tellingFor(
  tx: Tx,
  scope: ClubScope,
  outing: OutingDetail,
  step: OverdueStep,
  now: number,
): Promise<Telling> {
  if (step === 'member') {
    const self = { key: outing.memberId, name: outing.memberName, email: outing.memberEmail };
    return { readers: [self], outcome: 'mailed', more: '' };
  }
  const contact = await findContact(outing.userId, tx);
  if (step === 'officers') {
    const officers = (await listOfficers(scope, tx)).filter(({ memberId }) => memberId !== outing.memberId);
    const readers = officers.map(({ memberId, name, email }) => ({ key: memberId, name, email }));
    return {
      readers,
      outcome: readers.length > 0 ? 'mailed' : 'nobody',
      more: contactForecast(scope, outing, contact, now),
    };
  }
  const outcome = contactOutcome(outing, contact);
  if (!contact || outcome !== 'mailed') return { readers: [], outcome, more: '' };
  return {
    readers: [{ key: 'contact', name: contact.name, email: contact.email }],
    outcome,
    more: await contactLink(tx, outing, now),
  };
}

/** Takes one step if it is still to be taken: its row, mails and audit in one change. */
async function takeStep(scope: ClubScope, of: { id: string; moves: number }, step: OverdueStep, now: number) {
  return write(async (tx): Promise<boolean> => {
    const outing = await findOuting(scope, of.id, tx);
    if (!outing || outing.signedOutAt !== null || outing.moves !== of.moves) return false;
    const id = stepId(outing, step);
    const { readers, outcome, more } = await tellingFor(tx, scope, outing, step, now);
    const row = { id, clubId: scope.club.id, outingId: outing.id, step, moves: outing.moves, outcome, at: now };
    if (!(await insertStep(tx, row))) return false;
    for (const to of readers) await queueOverdueMail(tx, scope, { step, stepId: id, outing, to, more }, now);
    const summary = overdueAudit(outing.memberName, outing.standName, step, outcome);
    const detail = { step, outcome, told: readers.map((to) => to.name), backBy: outing.backBy };
    await auditOuting(tx, scope, 'told', { id: outing.id, summary, detail }, now);
    return true;
  });
}

/**
 * Tells of everybody who is overdue, step by step by the club's rule. A step missed while nothing ran is taken as soon as
 * something runs. Only a person's sign-out ends it. One outing that cannot be told of does not stop the others.
 */
export async function tellOverdue(now: number): Promise<{ told: number; failed: number }> {
  const count = { told: 0, failed: 0 };
  const past = await listPastBackBy(now);
  const taken = new Set((await listSteps(past.map(({ id }) => id))).map((row) => row.id));
  const scopes = new Map<string, ClubScope>();
  for (const outing of past) {
    try {
      const scope = scopes.get(outing.clubId) ?? (await systemScopeById(outing.clubId));
      scopes.set(outing.clubId, scope);
      for (const step of dueSteps(outing.backBy, scope.club.rules, now)) {
        if (!taken.has(stepId(outing, step)) && (await takeStep(scope, outing, step, now))) count.told += 1;
      }
    } catch (error) {
      count.failed += 1;
      log.error({ outing: outing.id, err: error }, 'an overdue person could not be told of');
    }
  }
  if (count.failed > 0) throw new Error(`${count.told} told, ${count.failed} could not be told of: see the log`);
  return count;
}
