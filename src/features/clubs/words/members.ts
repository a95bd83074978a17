export const MEMBER_WORDS = {
  guestDays: (from: string, to: string, over: boolean) => `${from} to ${to}${over ? ', over' : ''}`,
} as const;

const sitsAre = (count: number) => (count === 1 ? 'One booked sit is' : `${count} booked sits are`);

export const WHAT_GOES_WORDS = {
  noSits: (member: string) => `No sit of ${member} is booked ahead.`,
  sits: (count: number) => `${sitsAre(count)} cancelled, and a mail tells of each. The stands are free for others:`,
  guest: (guest: string, member: string, sits: number) =>
    `${guest}, a guest of ${member}, is taken out too.${sits > 0 ? ` ${sitsAre(sits)} cancelled:` : ''}`,
  invitations: (names: string[]) => `Open invitations are revoked: ${names.join(', ')}.`,
  stays: 'Past sits and the audit log stay as they are. Calendar addresses stop working.',
} as const;

export const INVITATIONS_WORDS = {
  /** `untilText` null: it works no longer. */
  facts: (row: {
    roleWord: string;
    sponsorName: string | null;
    guestText: string | null;
    sentText: string;
    untilText: string | null;
  }) => {
    const sponsor = row.sponsorName ? ` of ${row.sponsorName}` : '';
    const days = row.guestText ? `, ${row.guestText}` : '';
    const works = row.untilText ? `works until ${row.untilText}.` : 'too old now: send it again or revoke it.';
    return `${row.roleWord}${sponsor}${days}. Sent ${row.sentText}; ${works}`;
  },
  lost: 'The server could not be reached. Nothing was changed: try again.',
  notSent: 'Not sent',
  resent: (name: string) => `A new link is on its way to ${name}`,
  resentText: 'The old one no longer works.',
  sending: 'Sending…',
  resendLabel: (name: string) => `Send again to ${name}`,
  resend: 'Send again',
  revoked: (name: string) => `The invitation to ${name} is revoked`,
  revokeTitle: (name: string) => `Revoke the invitation to ${name}?`,
  revoke: 'Revoke',
  revokeLabel: (name: string) => `Revoke the invitation to ${name}`,
  revokeText: (name: string) => `The link in the mail stops working. You may invite ${name} again at any time.`,
} as const;

export const CHANGE_MEMBER_WORDS = {
  saved: (name: string) => `Saved: ${name}`,
  nothing: 'Nothing was different, so nothing was saved.',
  notSaved: 'This was not saved',
  save: 'Save',
} as const;

export const INVITE_WORDS = {
  sent: (name: string) => `Invitation to ${name} is on its way`,
  name: 'Name',
  email: 'E-mail',
  emailHint: 'The link goes there. It works once, for 14 days.',
  send: 'Send the invitation',
  sending: 'Sending…',
  back: 'Back to members',
} as const;

export const JOIN_WORDS = {
  notJoined: 'You have not joined',
  join: (club: string) => `Join ${club}`,
  joining: 'Joining…',
} as const;

export const JOIN_NEW_WORDS = {
  emailHint: 'Where the invitation went; you sign in with it.',
  join: (club: string) => `Make an account and join ${club}`,
  joining: 'Joining…',
} as const;

export const MEMBERS_WORDS = {
  name: 'Name',
  role: 'Role',
  joined: 'Joined',
  guestDays: 'Guest days',
  sponsor: 'Sponsor',
  caption: 'Members of the club',
  find: 'Find a member',
  you: '(you)',
} as const;

export const REMOVE_MEMBER_WORDS = {
  lost: 'The server could not be reached. Nothing was changed: try again.',
  removed: (member: string) => `${member} was removed`,
  sitsCancelled: (count: number) => `Sits cancelled: ${count}.`,
  removeTitle: (member: string) => `Remove ${member}?`,
  remove: 'Remove',
  removeLabel: (member: string) => `Remove ${member}`,
  leaveTitle: (club: string) => `Leave ${club}?`,
  leave: 'Leave the club',
  stay: 'Stay',
} as const;

export const STANDING_WORDS = {
  role: 'Role',
  sponsorId: 'Sponsor',
  sponsorIdHint: 'The member who answers for the guest. When the sponsor goes, so does the guest.',
  sponsorIdPlaceholder: 'Choose a member',
  guestFrom: 'First day',
  guestTo: 'Last day',
} as const;
