/** What a draw refuses, and what to do then. */
export const DRAW_ERRORS = {
  dayRange: 'Choose a day from today to a year ahead.',
  closesPast: 'Entries close after now.',
  closesLate: 'Entries close before the first day of the draw is over.',
  standGone: 'One of the stands is not in use. Choose anew.',
  chooseOrLeave: 'Choose a stand, or leave it to the score.',
  notOfDraw: 'Choose from the stands of this draw.',
  notASlot: 'Choose from the windows of this draw.',
  guestsOn: (when: string, why: string) => `${when}: ${why}`,
  states: {
    open: 'This draw has not been made yet. Reload the page to see how it stands.',
    drawn: 'This draw has been made. Reload the page to see how it stands.',
    published: 'This draw is published. Reload the page to see how it stands.',
    cancelled: 'This draw was called off. Reload the page to see how it stands.',
  },
  entriesClosed: (clock: string, day: string) => `Entries closed at ${clock} on ${day}.`,
  stillOpen: (clock: string, day: string) => `Members may enter until ${clock} on ${day}. Make the draw after that.`,
  nobodyEntered: 'Nobody entered this draw. Call it off.',
  noStands: 'None of the stands of this draw is in use any more. Call it off and open another.',
  nothingMayBeGiven: (rule: string | null) =>
    rule === null
      ? 'None of the stands asked for is in use any more. Call the draw off and open another.'
      : `Nobody may be given any of the stands asked for. ${rule}`,
  atWork: 'The draw is being made. Wait until it is done, or stop it first.',
  notAtWork: 'Nothing is being worked out any more. Reload the page to see how the draw stands.',
  noAnswer: 'No answer was found in time. Make the draw again, or draw for fewer stands.',
  failed: 'The draw could not be made. Try again.',
  lost: 'The work ended before it was done. Make the draw again.',
  cannotHave: (name: string, stand: string, when: string, why: string) =>
    `Nothing was booked: ${name} cannot have ${stand} any more (${when}). ${why} Make the draw again.`,
  aStand: 'the stand',
  nothingGiven: 'Nobody was given a stand: there is nothing to publish. Call the draw off, or make it again.',
  noSitToSwap: (name: string) => `${name} has no sit of this draw to swap.`,
  otherMember: 'Choose another member.',
  noOffer: (name: string) => `${name} offers no swap to you.`,
} as const;

/** Lines of the record that nobody can change. */
export const DRAW_AUDIT = {
  name: (title: string) => `the draw for ${title}`,
  opened: (draw: string) => `Opened ${draw}.`,
  cancelled: (draw: string) => `Called off ${draw}.`,
  made: (draw: string) => `Made ${draw}.`,
  published: (draw: string, sits: number) => `Published ${draw}: ${sits} ${sits === 1 ? 'sit' : 'sits'} booked.`,
  offered: (own: string, ownStand: string, other: string, otherStand: string) =>
    `${own} offered ${ownStand} to ${other} for ${otherStand}.`,
  swapped: (one: string, other: string) => `${one} and ${other} swapped stands.`,
} as const;
