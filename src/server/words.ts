export const SERVER_ERRORS = {
  tooManyTries: (minutes: number) => `Too many tries. Wait ${minutes} minute${minutes === 1 ? '' : 's'} and try again.`,
  signIn: 'Sign in to go on.',
  forbidden: (club: string) => `Your role in ${club} does not allow this. Ask a club admin.`,
  notFound: 'There is nothing here, or it is not open to you.',
  form: 'Look at the form again.',
  entries: 'Some entries need another look.',
  quicker: 'Somebody was a moment quicker. Reload the page and try again.',
  busy: 'Many people are saving at once. Try again in a moment.',
  internal: 'Something went wrong on our side. Nothing was saved; try again.',
  pressedLongAgo: 'This was pressed more than a day ago. Ask an officer to set the board right.',
} as const;

export const PLAIN_ISSUE_WORDS = {
  missing: 'This is missing.',
  wrongForm: 'This has the wrong form.',
  notListed: 'Choose one of the list.',
  more: 'There is more here than was asked for.',
  tooLong: 'This is too long.',
  tooMuch: 'This is too much.',
  tooShort: 'This is too short.',
  tooLittle: 'This is too little.',
  other: 'Look at this again.',
} as const;
