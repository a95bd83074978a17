import type { Metadata } from 'next';
import { ChangeMemberForm } from '@/features/clubs/components/change-member-form';
import { RemoveMember } from '@/features/clubs/components/remove-member';
import { WhatGoes } from '@/features/clubs/components/what-goes';
import { readMember, readSponsors } from '@/features/clubs/read-members';
import { planRemoval } from '@/features/clubs/removal';
import { MEMBER_PAGE_WORDS } from '@/features/clubs/words/pages';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { notFound } from '@/server/errors';
import { Notice } from '@/ui/notices';
import { DefinitionList, PageTitle, Section } from '@/ui/page-parts';
import { changeMemberAction, removeMemberAction } from '../actions';

export const metadata: Metadata = { title: MEMBER_PAGE_WORDS.title };

export default clubPage('members.write', async ({ scope, params }) => {
  const at = now();
  const member = await readMember(scope, params.member ?? '', at);
  const plan = member && (await planRemoval(scope, member.id, at));
  if (!member || !plan) throw notFound();
  const { id, name, role } = member;
  const sponsors = (await readSponsors(scope)).filter((sponsor) => sponsor.id !== id);
  const standing = {
    memberId: id,
    role,
    sponsorId: member.sponsorId ?? '',
    guestFrom: member.guestFrom ?? '',
    guestTo: member.guestTo ?? '',
  };
  const facts = [
    { term: MEMBER_PAGE_WORDS.email, detail: <span className="break-all">{member.email}</span> },
    { term: MEMBER_PAGE_WORDS.role, detail: member.roleWord },
    { term: MEMBER_PAGE_WORDS.joined, detail: member.joinedText },
    ...(member.guestText ? [{ term: MEMBER_PAGE_WORDS.guestDays, detail: member.guestText }] : []),
    ...(member.sponsorName ? [{ term: MEMBER_PAGE_WORDS.sponsor, detail: member.sponsorName }] : []),
  ];
  return (
    <>
      <PageTitle title={member.isYou ? `${name} (you)` : name} over={MEMBER_PAGE_WORDS.title} />
      <DefinitionList items={facts} className="max-w-2xl" />
      {plan.lastAdmin ? (
        <Notice title={MEMBER_PAGE_WORDS.onlyAdmin} className="mt-6">
          {MEMBER_PAGE_WORDS.onlyAdminText(name)}
        </Notice>
      ) : (
        <>
          <Section title={MEMBER_PAGE_WORDS.changeRole}>
            <ChangeMemberForm
              club={scope.club.slug}
              member={standing}
              sponsors={sponsors}
              action={changeMemberAction}
            />
          </Section>
          <Section title={MEMBER_PAGE_WORDS.remove} note={MEMBER_PAGE_WORDS.removeNote}>
            <WhatGoes plan={plan} />
            <div className="mt-4">
              <RemoveMember club={scope.club.slug} member={{ id, name }} action={removeMemberAction}>
                <WhatGoes plan={plan} />
              </RemoveMember>
            </div>
          </Section>
        </>
      )}
    </>
  );
});
