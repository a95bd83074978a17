export const SIT_ERRORS = {
  signedInThere: (member: string) => `${member} is signed in there: sign out on the board.`,
  hasSatThere: (member: string) => `${member} has sat there: it stays on record.`,
  seats: (stand: string, seats: number, people: number) =>
    `${stand} has ${seats} ${seats === 1 ? 'seat' : 'seats'}, and this sit needs ${people}.`,
  taken: (day: string, holders: { standName: string; memberName: string }[]) => {
    const held = holders.map(({ standName, memberName }) => `${memberName} has ${standName}`).join(', ');
    return `The stand is taken on ${day}: ${held || 'somebody was a moment quicker'}.`;
  },
  guestWithoutDates: (guest: string, day: string) => `${guest} may not sit on ${day}: no dates are set for this guest.`,
  guestOutOfDates: (guest: string, day: string, from: string, to: string) =>
    `${guest} may not sit on ${day}: the invitation is from ${from} to ${to}.`,
  onlyAdminBooks: 'Only a club admin books for another member.',
  sentBefore: 'This form was sent before by somebody else. Reload the page and try again.',
  notSaved: 'The sit could not be saved. Try again.',
  sponsor: 'The sponsor',
  member: 'A member',
  standGone: 'This stand is no longer in use.',
  cancelOnlyOwn: (member: string) => `This is ${member}'s sit. Only they or a club admin can cancel it.`,
  cancelEnded: (end: string) => `This sit ended at ${end}: it stays on record.`,
  sayWhy: (member: string) => `Say why: ${member} is told the reason.`,
  changeOnlyOwn: (member: string) => `This is ${member}'s sit. Only they or a club admin can change it.`,
  cancelled: 'This sit was cancelled. Book it anew.',
  lapsed: 'This sit lapsed, unsigned. Book it anew if it is free.',
  changeEnded: (end: string) => `This sit ended at ${end}: it stays on record as it is.`,
  changedSince: 'This sit was changed after you opened it. Reload the page to see it as it is now.',
  guestNamedTwice: 'A guest is named twice.',
  ownGuest: 'Nobody can be their own guest.',
  guestGone: 'A guest is no longer in the club. Name them by hand.',
  standNotInUse: 'This stand is not in use. Choose another.',
  notMember: 'This person is not a member of the club.',
  noWay: (stand: string) => `This is no way in to ${stand}. Choose another.`,
  guestWithoutSponsor: (guest: string) => `${guest} is a guest, and no member of the club answers for them now.`,
} as const;

export const SIT_FIELD_ERRORS = {
  chooseOne: 'Choose one.',
  notListed: 'Choose one of the list.',
  guestName: "Write the guest's name.",
  nameLong: 'A name has 60 characters at most.',
  day: 'Write a day as YYYY-MM-DD.',
  dayFar: 'Choose a day of this century.',
  windows: 'Choose morning, evening or all day.',
  weapon: 'Choose a weapon.',
  guests: 'Name ten guests at most.',
  noteLong: 'A note has 500 characters at most.',
  reload: 'Reload the page and try again.',
  reasonLong: 'A reason has 200 characters at most.',
} as const;
