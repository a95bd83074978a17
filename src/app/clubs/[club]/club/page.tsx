import type { Metadata } from 'next';
import { LeaveClub } from '@/features/clubs/components/remove-member';
import { WhatGoes } from '@/features/clubs/components/what-goes';
import { placeLines } from '@/features/clubs/place-words';
import { readMember } from '@/features/clubs/read-members';
import { planRemoval } from '@/features/clubs/removal';
import { ROLE_NOTES } from '@/features/clubs/role-words';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { notFound } from '@/server/errors';
import { ButtonLink } from '@/ui/button';
import { DefinitionList, PageTitle, Section } from '@/ui/page-parts';
import { leaveAction } from './actions';

export const metadata: Metadata = { title: 'Club' };

export default clubPage('club.read', async ({ scope }) => {
  const at = now();
  const { club } = scope;
  const you = await readMember(scope, scope.member.id, at);
  const plan = await planRemoval(scope, scope.member.id, at);
  if (!you || !plan) throw notFound();
  const base = `/clubs/${club.slug}`;
  const yours = [
    { term: 'Name', detail: you.name },
    { term: 'Role', detail: `${you.roleWord}. ${ROLE_NOTES[you.role]}` },
    { term: 'Joined', detail: you.joinedText },
    ...(you.guestText ? [{ term: 'Your days', detail: you.guestText }] : []),
    ...(you.sponsorName ? [{ term: 'Sponsor', detail: you.sponsorName }] : []),
  ];
  // Whoever may not see the stands is not told where the ground lies.
  const lines = placeLines({ ...club, units: club.clubUnits });
  const place = scope.can('stands.read') ? lines : lines.filter((line) => line.label !== 'Place');
  return (
    <>
      <PageTitle title={club.name} actions={<ButtonLink href={`${base}/club/rules`}>Club rules</ButtonLink>} />
      {scope.can('members.write') && (
        <Section title="Setting up" note="What a club needs before its first sit, in this order.">
          <div className="flex flex-wrap gap-2">
            <ButtonLink href={`${base}/club/rules/edit`}>Set the rules</ButtonLink>
            <ButtonLink href={`${base}/ground`}>Put in parking and ground</ButtonLink>
            <ButtonLink href={`${base}/stands`}>Add stands</ButtonLink>
            <ButtonLink href={`${base}/club/members/invite`}>Invite members</ButtonLink>
          </div>
        </Section>
      )}
      <Section
        title="The club"
        actions={
          scope.can('rules.write') && (
            <ButtonLink href={`${base}/club/place`} look="quiet">
              Change name or place
            </ButtonLink>
          )
        }
      >
        <DefinitionList items={place.map(({ label, text }) => ({ term: label, detail: text }))} className="max-w-2xl" />
      </Section>
      <Section title="You in this club">
        <DefinitionList items={yours} className="max-w-2xl" />
        <div className="mt-4">
          {plan.lastAdmin ? (
            <p className="text-ink-soft">You are the only admin. Make another member an admin before you leave.</p>
          ) : (
            <LeaveClub club={club.slug} clubName={club.name} action={leaveAction}>
              <WhatGoes plan={plan} />
            </LeaveClub>
          )}
        </div>
      </Section>
    </>
  );
});
