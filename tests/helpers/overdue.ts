import { eq } from 'drizzle-orm';
import type { ClubRules } from '@/core/booking/rules';
import { reader } from '@/db/client';
import { outbox } from '@/db/schema';
import { answerContact } from '@/features/outings/answer-contact';
import type { OutingDetail } from '@/features/outings/data';
import { saveContact } from '@/features/outings/save-contact';
import { book, smallClub } from './book';
import { addMember, TEST_NOW, type TestClub, type TestMember } from './make-club';
import { goIn, MINUTE, outingRows, windowAt } from './outings';

export interface OverdueStage {
  club: TestClub;
  ann: TestMember;
  officer: TestMember;
  outing: OutingDetail;
  /** The instant from which Ann counts as overdue. */
  due: number;
}

/** Ann Roe has signed in for the Saturday morning; Cora Pike is an officer of her club. */
export async function stageOverdue(rules: Partial<ClubRules> = {}, contactOff = false): Promise<OverdueStage> {
  const { club, ann, oak } = await smallClub({ backByMinutes: 60, ...rules });
  const officer = await addMember(club, 'steward', { name: 'Cora Pike' });
  const sit = await book(ann, oak);
  const outing = await goIn(ann, sit.id, windowAt(ann).startAt, { vehicle: 'grey truck, GA 123', contactOff });
  return { club, ann, officer, outing, due: outing.backBy + 60 * MINUTE };
}

export const asUser = (who: TestMember) => ({
  id: who.userId,
  name: who.name,
  email: who.email,
  emailVerifiedAt: TEST_NOW,
});

/** The secret of the first link to a path in a text. */
export const secretIn = (text: string, path: string) => new RegExp(`/${path}/([\\w-]{20,60})`).exec(text)?.[1] ?? '';

/** The words of the newest mail of a kind. */
export async function lastMail(kind: string): Promise<string> {
  const rows = await reader().select().from(outbox).where(eq(outbox.kind, kind));
  return rows.at(-1)?.message?.text ?? '';
}

/** Names a contact for somebody and has them agree; the secret of the link that asked. */
export async function agree(who: TestMember, email = 'wife@example.test'): Promise<string> {
  await saveContact(asUser(who), { name: 'May Roe', email }, TEST_NOW);
  const secret = secretIn(await lastMail('contact.asked'), 'contact');
  await answerContact({ secret, answer: 'yes' }, TEST_NOW);
  return secret;
}

export async function overdueKinds(clubId: string): Promise<string[]> {
  const { mail } = await outingRows(clubId);
  return mail.map((one) => one.kind).filter((kind) => kind.startsWith('overdue'));
}
