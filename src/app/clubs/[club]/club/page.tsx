import type { Metadata } from 'next';
import { LeaveClub } from '@/features/clubs/components/remove-member';
import { WhatGoes } from '@/features/clubs/components/what-goes';
import { readMember } from '@/features/clubs/read-members';
import { planRemoval } from '@/features/clubs/removal';
import { CLUB_PAGE_WORDS } from '@/features/clubs/words/pages';
import { placeLines } from '@/features/clubs/words/place';
import { ROLE_NOTES } from '@/features/clubs/words/roles';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { notFound } from '@/server/errors';
import { ButtonLink } from '@/ui/button';
import { DefinitionList, PageTitle, Section } from '@/ui/page-parts';
import { leaveAction } from './actions';

export const metadata: Metadata = { title: CLUB_PAGE_WORDS.title };

export default clubPage('club.read', async ({ scope }) => {
  const at = now();
  const { club } = scope;
  const you = await readMember(scope, scope.member.id, at);
  const plan = await planRemoval(scope, scope.member.id, at);
  if (!you || !plan) throw notFound();
  const base = `/clubs/${club.slug}`;
  const yours = [
    { term: CLUB_PAGE_WORDS.name, detail: you.name },
    { term: CLUB_PAGE_WORDS.role, detail: `${you.roleWord}. ${ROLE_NOTES[you.role]}` },
    { term: CLUB_PAGE_WORDS.joined, detail: you.joinedText },
    ...(you.guestText ? [{ term: CLUB_PAGE_WORDS.yourDays, detail: you.guestText }] : []),
    ...(you.sponsorName ? [{ term: CLUB_PAGE_WORDS.sponsor, detail: you.sponsorName }] : []),
  ];
  // Whoever may not see the stands is not told where the ground lies.
  const place = placeLines({ ...club, units: club.clubUnits }, scope.can('stands.read'));
  return (
    <>
      <PageTitle
        title={club.name}
        actions={<ButtonLink href={`${base}/club/rules`}>{CLUB_PAGE_WORDS.clubRules}</ButtonLink>}
      />
      {scope.can('members.write') && (
        <Section title={CLUB_PAGE_WORDS.settingUp} note={CLUB_PAGE_WORDS.settingUpNote}>
          <div className="flex flex-wrap gap-2">
            <ButtonLink href={`${base}/club/rules/edit`}>{CLUB_PAGE_WORDS.setRules}</ButtonLink>
            <ButtonLink href={`${base}/ground`}>{CLUB_PAGE_WORDS.ground}</ButtonLink>
            <ButtonLink href={`${base}/stands`}>{CLUB_PAGE_WORDS.stands}</ButtonLink>
            <ButtonLink href={`${base}/club/members/invite`}>{CLUB_PAGE_WORDS.invite}</ButtonLink>
          </div>
        </Section>
      )}
      <Section
        title={CLUB_PAGE_WORDS.theClub}
        actions={
          scope.can('rules.write') && (
            <ButtonLink href={`${base}/club/place`} look="quiet">
              {CLUB_PAGE_WORDS.change}
            </ButtonLink>
          )
        }
      >
        <DefinitionList items={place.map(({ label, text }) => ({ term: label, detail: text }))} className="max-w-2xl" />
      </Section>
      <Section title={CLUB_PAGE_WORDS.you}>
        <DefinitionList items={yours} className="max-w-2xl" />
        <div className="mt-4">
          {plan.lastAdmin ? (
            <p className="text-ink-soft">{CLUB_PAGE_WORDS.onlyAdmin}</p>
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
