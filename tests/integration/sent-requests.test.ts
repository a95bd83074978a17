import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { reader } from '@/db/client';
import { auditLog, sentRequests, sitLogVersions, visits } from '@/db/schema';
import { addVisit } from '@/features/logs/add-visit';
import { removeVisit } from '@/features/logs/remove-visit';
import { saveLog } from '@/features/logs/save-log';
import { signOut } from '@/features/outings/sign-out';
import { JOBS } from '@/jobs/list';
import { newRequestKey } from '@/lib/request-key';
import { setClock } from '@/server/clock';
import { book, refusal, smallClub } from '../helpers/book';
import { logOf, onSaturday, sitAndLog } from '../helpers/log-sits';
import type { TestClub, TestMember } from '../helpers/make-club';
import { goIn, HOUR, MINUTE, outingRows, windowAt } from '../helpers/outings';

let club: TestClub;
let ann: TestMember;
let bert: TestMember;
let oak: string;
let startAt: number;

beforeEach(async () => {
  ({ club, ann, bert, oak } = await smallClub());
  ({ startAt } = windowAt(ann));
  setClock(() => startAt - HOUR);
});

const press = (at: number) => ({ key: newRequestKey(), at });
const auditOf = (subject: string) => reader().select().from(auditLog).where(eq(auditLog.subjectId, subject));

describe('what was pressed without signal', () => {
  it('signs in and out at the time of the press, in order, though both are sent hours later', async () => {
    const sit = await book(ann, oak);
    const sentAt = startAt + 6 * HOUR;
    await goIn(ann, sit.id, sentAt, { sent: press(startAt - 30 * MINUTE) });
    const out = await signOut(ann.scope, { sitId: sit.id, sent: press(startAt + 2 * HOUR) }, sentAt);
    expect(out.signedInAt).toBe(startAt - 30 * MINUTE);
    expect(out.signedOutAt).toBe(startAt + 2 * HOUR);
    // The next 11:30 after the press, not after the sending.
    expect(out.backBy).toBe(Date.UTC(2026, 10, 7, 16, 30));
    expect(sentAt).toBeGreaterThan(out.backBy);
    const written = await auditOf(out.id);
    expect(written.map((row) => row.at)).toEqual([sentAt, sentAt]);
    expect(written[0]?.summary).toMatch(/Pressed at .* and sent later\.$/);
  });

  it('is done once however often it is sent, even when the first has been signed out since', async () => {
    const sit = await book(ann, oak);
    const sent = press(startAt - 30 * MINUTE);
    const first = await goIn(ann, sit.id, startAt, { sent });
    await signOut(ann.scope, { outingId: first.id }, startAt + HOUR);
    const again = await goIn(ann, sit.id, startAt + 2 * HOUR, { sent });
    expect(again.id).toBe(first.id);
    expect((await outingRows(club.id)).outings).toHaveLength(1);
  });

  it('counts a key for the member who sent it alone', async () => {
    const sent = press(startAt - 30 * MINUTE);
    const hers = await goIn(ann, (await book(ann, oak)).id, startAt, { sent });
    await signOut(ann.scope, { outingId: hers.id }, startAt + HOUR);
    const evening = windowAt(bert, 'evening').startAt;
    const his = await goIn(bert, (await book(bert, oak, { windows: 'evening' })).id, evening, {
      sent: { ...sent, at: evening },
      backBy: '20:00',
    });
    expect(his.id).not.toBe(hers.id);
  });

  it('never signs in ahead of the clock, after a day, or before the gate opens', async () => {
    const sit = await book(ann, oak);
    const ahead = await goIn(ann, sit.id, startAt, { sent: press(startAt + 5 * HOUR) });
    expect(ahead.signedInAt).toBe(startAt);
    const old = { sitId: sit.id, sent: press(startAt - 24 * HOUR) };
    expect((await refusal(signOut(ann.scope, old, startAt + HOUR))).message).toContain('more than a day ago');
    const late = await book(bert, oak, { windows: 'evening' });
    const early = goIn(bert, late.id, startAt + HOUR, { sent: press(startAt - HOUR) });
    expect((await refusal(early)).message).toContain('Signing in opens at');
  });

  it('says in plain words that nobody signed in for a sit', async () => {
    const sit = await book(ann, oak);
    expect((await refusal(signOut(ann.scope, { sitId: sit.id }, startAt))).message).toContain('Nobody signed in');
    expect((await refusal(signOut(bert.scope, { sitId: 'sit_unknown' }, startAt))).code).toBe('conflict');
  });

  it('keeps a log sent twice as one, though somebody has changed it in between', async () => {
    setClock(() => onSaturday('12:00'));
    const sent = press(onSaturday('11:00'));
    const sit = await sitAndLog(ann, oak, { does: 2, sent });
    await saveLog(ann.scope, logOf(sit.id, { version: 1, does: 4 }), onSaturday('12:10'));
    const again = await saveLog(ann.scope, logOf(sit.id, { does: 2, sent }), onSaturday('12:20'));
    expect(again.version).toBe(2);
    const versions = await reader().select().from(sitLogVersions).where(eq(sitLogVersions.sitId, sit.id));
    expect(versions).toHaveLength(1);
  });

  it('does not bring back a visit that was removed', async () => {
    const at = startAt + HOUR;
    const sent = press(at);
    const visit = {
      kind: 'camera_check' as const,
      day: '2026-11-07',
      clock: '05:00',
      place: { of: 'stand' as const, id: oak },
      bumped: 0,
      notes: '',
    };
    const first = await addVisit(ann.scope, visit, at, sent);
    await removeVisit(ann.scope, first.id, at);
    expect((await addVisit(ann.scope, visit, at, sent)).id).toBe(first.id);
    expect(await reader().select().from(visits).where(eq(visits.clubId, club.id))).toHaveLength(1);
  });

  it('is remembered for more than a year, since a phone may wait that long, and then forgotten', async () => {
    const at = startAt + HOUR;
    const sent = press(at);
    const place = { of: 'stand' as const, id: oak };
    const visit = { kind: 'camera_check' as const, day: '2026-11-07', clock: '05:00', place, bumped: 0, notes: '' };
    await addVisit(ann.scope, visit, at, sent);
    const tidy = JOBS.find((job) => job.name === 'tidy');
    const kept = () => reader().select().from(sentRequests).where(eq(sentRequests.clubId, club.id));
    await tidy?.run(at + 366 * 24 * HOUR);
    expect(await kept()).toHaveLength(1);
    await addVisit(ann.scope, visit, at + MINUTE, sent);
    expect(await reader().select().from(visits).where(eq(visits.clubId, club.id))).toHaveLength(1);
    await tidy?.run(at + 401 * 24 * HOUR);
    expect(await kept()).toEqual([]);
  });
});
