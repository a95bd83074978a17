import { redirect } from 'next/navigation';
import { env } from '@/env';
import { listMyClubs } from '@/features/accounts/reads';
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
      <PageTitle
        title="Sit where the deer never know"
        lead="Windrest is for deer-hunting clubs, leases and family land. Each day it tells each member where a sit alerts no deer, and who else is in the woods."
      />
      <div className="flex flex-wrap gap-3">
        <ButtonLink href="/sign-up" look="primary">
          Make an account
        </ButtonLink>
        <ButtonLink href="/sign-in">Sign in</ButtonLink>
        {env.demoSignIn && <TryDemoButton action={demoSignInAction} />}
      </div>
      <Section title="A quiet stand first" heading="margin" className="mt-10">
        <p className="max-w-prose">
          Every stand of the club is ranked for the morning or the evening by the wind through the whole sit, the way in
          and out, the sun, and how lately people were near. The list says why, and when to leave the gate.
        </p>
      </Section>
      <Section title="One stand, one hunter" heading="margin">
        <p className="max-w-prose">
          A booked sit is taken for everyone. The club’s own rules on rest days, guests, distance and seasons hold the
          same for all, and a refusal names its rule.
        </p>
      </Section>
      <Section title="Everyone home" heading="margin">
        <p className="max-w-prose">
          The board shows who is booked and where. Windrest is no rescue service: tell someone where you go and when you
          will be back.
        </p>
      </Section>
    </PlainFrame>
  );
});
