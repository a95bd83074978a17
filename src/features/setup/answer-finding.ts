import { fromLocal } from '@/core/geometry';
import type { Finding } from '@/core/setup-check/setup-types';
import { type Tx, write } from '@/db/client';
import { addChoreIn } from '@/features/chores/save-chore';
import { NAME_MAX, NOTES_MAX } from '@/features/ground/read-form';
import type { VisitPlace } from '@/features/logs/visit-schema';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { checkClub } from './check-club';
import { deleteSetupAnswer, listSetupAnswers, putSetupAnswer } from './setup-data';
import type { AcceptFinding, DismissFinding } from './setup-schema';
import { RECORD_WORDS as W } from './words/answers';
import { workText } from './work-rules';

/** The finding as it is now: one that went, or whose ground changed since it was read, is not answered blindly. */
async function needFinding(scope: ClubScope, at: { key: string; print: string }, now: number): Promise<Finding> {
  const { findings } = await checkClub(scope, now);
  const finding = findings.find(({ key }) => key === at.key);
  if (!finding) throw new AppError('conflict', W.gone);
  if (finding.print !== at.print) {
    throw new AppError('conflict', W.changed);
  }
  return finding;
}

async function refuseAnswered(scope: ClubScope, finding: Finding, tx: Tx): Promise<void> {
  const held = (await listSetupAnswers(scope, tx)).get(finding.key);
  if (held && held.print === finding.print) {
    throw new AppError('conflict', W.answeredBy(held.byName));
  }
}

function note(scope: ClubScope, tx: Tx, finding: { key: string; verb: string; summary: string }, now: number) {
  const entry = { clubId: scope.club.id, actor: scope.actor, subjectType: 'finding', subjectId: finding.key };
  return audit(tx, { ...entry, action: `finding.${finding.verb}`, summary: finding.summary }, now);
}

function placeOf(scope: ClubScope, finding: Finding): VisitPlace {
  const { of, id } = finding.subject;
  if (of === 'stand' || of === 'feature') return { of, id };
  return { of: 'point', ...fromLocal(scope.club, finding.at) };
}

/** Makes a chore of what could be done, with its place. */
export async function acceptFinding(scope: ClubScope, input: AcceptFinding, now: number): Promise<{ choreId: string }> {
  const finding = await needFinding(scope, input, now);
  const act = finding.acts[input.act];
  if (!act) throw notFound();
  return write(async (tx) => {
    await refuseAnswered(scope, finding, tx);
    const title = act.text.slice(0, NAME_MAX * 2);
    const notes = W.choreNotes(finding.text, finding.why, workText(scope.club.rules, act.work)).slice(0, NOTES_MAX);
    const place = placeOf(scope, finding);
    const { id } = await addChoreIn(tx, scope, { title, notes, assigneeId: null, place, dueOn: null }, now);
    const { key: findingKey, print, text } = finding;
    const by = { byMemberId: scope.member.id, at: now };
    await putSetupAnswer(scope, tx, { findingKey, print, text, answer: 'chore', reason: '', choreId: id, ...by });
    await note(scope, tx, { key: findingKey, verb: 'accepted', summary: W.accepted(text) }, now);
    return { choreId: id };
  });
}

/** Leaves it as it is, with the reason; it comes back when the ground changes. */
export async function dismissFinding(scope: ClubScope, input: DismissFinding, now: number): Promise<{ key: string }> {
  const finding = await needFinding(scope, input, now);
  return write(async (tx) => {
    await refuseAnswered(scope, finding, tx);
    const { key: findingKey, print, text } = finding;
    const by = { byMemberId: scope.member.id, at: now };
    const { reason } = input;
    await putSetupAnswer(scope, tx, { findingKey, print, text, answer: 'dismissed', reason, choreId: null, ...by });
    await note(scope, tx, { key: findingKey, verb: 'dismissed', summary: W.dismissed(text, reason) }, now);
    return { key: findingKey };
  });
}

/** Brings an answered finding back to the list. */
export async function reopenFinding(scope: ClubScope, key: string, now: number): Promise<{ key: string }> {
  return write(async (tx) => {
    const held = (await listSetupAnswers(scope, tx)).get(key);
    if (!held) throw notFound();
    await deleteSetupAnswer(scope, tx, key);
    await note(scope, tx, { key, verb: 'reopened', summary: W.reopened(held.text) }, now);
    return { key };
  });
}
