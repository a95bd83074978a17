import { redirect } from 'next/navigation';
import { env } from '@/env';
import { listMyClubs } from '@/features/accounts/reads';
import { HOME_WORDS } from '@/features/accounts/words/public';
import { TryDemoButton } from '@/features/demo/components/try-demo-button';
import { now } from '@/server/clock';
import { publicPage } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { PageTitle, Section } from '@/ui/page-parts';
import { demoSignInAction } from './actions';
import { PlainFrame } from './plain-frame';

export default publicPage(async ({ user }) => {
  if (user) {
    const clubs = await listMyClubs(user.id, now());
    redirect(clubs.length === 1 ? `/clubs/${clubs[0]?.slug}` : '/clubs');
  }
  return (
    <PlainFrame width="page">
      <PageTitle title={HOME_WORDS.heading} lead={HOME_WORDS.lead} />
      <div className="flex flex-wrap gap-3">
        <ButtonLink href="/sign-up" look="primary">
          {HOME_WORDS.signUp}
        </ButtonLink>
        <ButtonLink href="/sign-in">{HOME_WORDS.signIn}</ButtonLink>
        {env.demoSignIn && <TryDemoButton action={demoSignInAction} />}
      </div>
      <Section title={HOME_WORDS.quiet} heading="margin" className="mt-10">
        <p className="max-w-prose">{HOME_WORDS.quietText}</p>
      </Section>
      <Section title={HOME_WORDS.booked} heading="margin">
        <p className="max-w-prose">{HOME_WORDS.bookedText}</p>
      </Section>
      <Section title={HOME_WORDS.home} heading="margin">
        <p className="max-w-prose">{HOME_WORDS.homeText}</p>
      </Section>
    </PlainFrame>
  );
});
