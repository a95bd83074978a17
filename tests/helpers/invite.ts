import { and, eq } from 'drizzle-orm';
import { inviteAction } from '@/app/clubs/[club]/club/members/actions';
import { reader } from '@/db/client';
import { invitations, outbox } from '@/db/schema';
import type { InviteForm } from '@/features/clubs/member-schema';
import type { TestClub, TestMember } from './make-club';
import { inRequest } from './request';

let count = 0;

export function invited(more: Partial<InviteForm> = {}): InviteForm {
  count += 1;
  const email = `invited-${count}@example.test`;
  return { name: `Invited ${count}`, email, role: 'member', sponsorId: '', guestFrom: '', guestTo: '', ...more };
}

/** The secret in the newest invitation mailed to an address. */
export async function invitationToken(email: string): Promise<string> {
  const mails = await reader()
    .select()
    .from(outbox)
    .where(and(eq(outbox.toEmail, email), eq(outbox.kind, 'club.invited')));
  const token = mails.map((mail) => /\/invite\/([\w-]+)/.exec(mail.message?.text ?? '')?.[1]).at(-1);
  if (!token) throw new Error(`No invitation was mailed to ${email}.`);
  return token;
}

export const invitationsOf = (club: TestClub) =>
  reader().select().from(invitations).where(eq(invitations.clubId, club.id));

/** Invites by the action and gives the mailed secret. */
export async function invite(club: TestClub, admin: TestMember, values: InviteForm): Promise<string> {
  const answer = await inRequest(admin.browser, () => inviteAction(club.slug, values));
  if (!answer.ok) throw new Error(answer.error.message);
  return invitationToken(values.email);
}
