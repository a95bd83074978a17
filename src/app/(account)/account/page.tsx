import type { Metadata } from 'next';
import { ConfirmEmailNotice } from '@/features/accounts/components/confirm-email-notice';
import { NameForm } from '@/features/accounts/components/name-form';
import { PasswordForm } from '@/features/accounts/components/password-form';
import { SessionsList } from '@/features/accounts/components/sessions-list';
import { SignOutButton, SignOutEverywhereButton } from '@/features/accounts/components/sign-out-button';
import { UnitsForm } from '@/features/accounts/components/units-form';
import { listMySessions, readMyUnits } from '@/features/accounts/reads';
import { ACCOUNT_PAGE_WORDS } from '@/features/accounts/words/pages';
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

export const metadata: Metadata = { title: ACCOUNT_PAGE_WORDS.title };

export default accountPage(async ({ user }) => {
  const sessions = await listMySessions(user, now());
  const contact = await readContact(user.id, now());
  return (
    <>
      <PageTitle
        title={ACCOUNT_PAGE_WORDS.title}
        lead={user.email}
        actions={<TextLink href="/clubs">{ACCOUNT_PAGE_WORDS.yourClubs}</TextLink>}
      />
      {user.emailVerifiedAt === null && <ConfirmEmailNotice email={user.email} action={resendAction} />}
      <Section title={ACCOUNT_PAGE_WORDS.name} note={ACCOUNT_PAGE_WORDS.nameNote}>
        <NameForm name={user.name} action={changeNameAction} />
      </Section>
      <Section title={ACCOUNT_PAGE_WORDS.units} note={ACCOUNT_PAGE_WORDS.unitsNote}>
        <UnitsForm units={await readMyUnits(user)} action={changeUnitsAction} />
      </Section>
      <Section title={ACCOUNT_PAGE_WORDS.safetyContact} note={ACCOUNT_PAGE_WORDS.safetyContactNote}>
        <ContactForm
          key={contact?.email}
          contact={contact}
          actions={{ save: saveContactAction, switchOff: switchContactAction, remove: removeContactAction }}
        />
      </Section>
      <Section title={ACCOUNT_PAGE_WORDS.password}>
        <PasswordForm email={user.email} action={changePasswordAction} />
      </Section>
      <Section title={ACCOUNT_PAGE_WORDS.signedInBrowsers} note={ACCOUNT_PAGE_WORDS.signedInBrowsersNote}>
        <SessionsList sessions={sessions} endAction={endSessionAction} />
        <div className="mt-5 flex flex-wrap gap-3">
          <SignOutButton action={signOutAction} />
          <SignOutEverywhereButton action={signOutEverywhereAction} />
        </div>
      </Section>
    </>
  );
});
