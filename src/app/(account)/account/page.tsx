import type { Metadata } from 'next';
import { ConfirmEmailNotice } from '@/features/accounts/components/confirm-email-notice';
import { NameForm } from '@/features/accounts/components/name-form';
import { PasswordForm } from '@/features/accounts/components/password-form';
import { SessionsList } from '@/features/accounts/components/sessions-list';
import { SignOutButton, SignOutEverywhereButton } from '@/features/accounts/components/sign-out-button';
import { UnitsForm } from '@/features/accounts/components/units-form';
import { listMySessions, readMyUnits } from '@/features/accounts/reads';
import { ContactForm } from '@/features/outings/components/contact-form';
import { readContact } from '@/features/outings/read-contact';
import { now } from '@/server/clock';
import { accountPage } from '@/server/doors';
import { TextLink } from '@/ui/button';
import { PageTitle, Section } from '@/ui/page-parts';
import { resendAction } from '../verify/actions';
import {
  changeNameAction,
  changePasswordAction,
  changeUnitsAction,
  endSessionAction,
  removeContactAction,
  saveContactAction,
  signOutAction,
  signOutEverywhereAction,
  switchContactAction,
} from './actions';

export const metadata: Metadata = { title: 'Account' };

export default accountPage(async ({ user }) => {
  const sessions = await listMySessions(user, now());
  const contact = await readContact(user.id, now());
  return (
    <>
      <PageTitle title="Account" lead={user.email} actions={<TextLink href="/clubs">Your clubs</TextLink>} />
      {user.emailVerifiedAt === null && <ConfirmEmailNotice email={user.email} action={resendAction} />}
      <Section title="Name" note="Members of your clubs see it.">
        <NameForm name={user.name} action={changeNameAction} />
      </Section>
      <Section title="Units" note="How figures are shown to you, in every club. What others see stays as it is.">
        <UnitsForm units={await readMyUnits(user)} action={changeUnitsAction} />
      </Section>
      <Section
        title="Safety contact"
        note="Somebody at home who is mailed when you have not signed out in time, in any of your clubs."
      >
        <ContactForm
          key={contact?.email}
          contact={contact}
          actions={{ save: saveContactAction, switchOff: switchContactAction, remove: removeContactAction }}
        />
      </Section>
      <Section title="Password">
        <PasswordForm email={user.email} action={changePasswordAction} />
      </Section>
      <Section title="Signed-in browsers" note="One you do not know? Sign it out, then change your password.">
        <SessionsList sessions={sessions} endAction={endSessionAction} />
        <div className="mt-5 flex flex-wrap gap-3">
          <SignOutButton action={signOutAction} />
          <SignOutEverywhereButton action={signOutEverywhereAction} />
        </div>
      </Section>
    </>
  );
});
