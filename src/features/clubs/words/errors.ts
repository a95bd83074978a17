export const CLUB_ERRORS = {
  lostSits: (member: string, sits: string) =>
    `${member} has sits booked that this would not allow: ${sits}. Cancel them first.`,
  answersFor: (member: string, guests: string) =>
    `${member} answers for ${guests}. Give them another sponsor, remove them or revoke the invitation first.`,
  onlyAdmin: (member: string) => `${member} is the club's only admin. Make another member an admin first.`,
  ownSponsor: 'A guest cannot answer for themselves. Choose another member.',
  sponsor: 'Choose a member of the club who hunts: that person answers for the guest.',
  daysPast: 'The last day is past. Choose a day from today on.',
  confirmFirst: 'Confirm your e-mail address first: open the link we mailed you, then start the club.',
  slugTaken: 'Another club has this address. Choose another.',
  memberAlready: (member: string) => `${member} is a member already, with this address.`,
  invitationWaits: `An invitation to this address is waiting already. Send it again from the members page, or revoke it.`,
  invitationSpent:
    'This invitation was used already, was revoked or is too old. Ask whoever invited you for a new one.',
  invitationOver: 'The days of this invitation are over. Ask whoever invited you for new ones.',
  inClub: 'You are in this club already.',
  somebody: 'Somebody',
  changedSince: (who: string) =>
    `${who} saved a change while you had this page open. What you typed is still here and nothing was overwritten. Open the page in another tab to see the change, then load this one again and make yours.`,
} as const;
