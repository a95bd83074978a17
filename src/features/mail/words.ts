export const MAIL_FRAME_WORDS = {
  by: (club: string) => `${club}, by Windrest`,
  orOpen: (url: string) => `Or open ${url}`,
} as const;

/** Pages for developers, where no mail leaves the machine. */
export const KEPT_MAIL_WORDS = {
  title: 'Kept mail',
  over: 'For developers',
  lead: 'What would have been sent. Nothing left this machine.',
  none: 'No mail yet',
  noneText: 'Mail stands here within a few seconds of being queued.',
  caption: 'The newest 200, newest first',
  subject: 'Subject',
  to: 'To',
  keptAt: 'Kept at',
  utc: (dayAndClock: string) => `${dayAndClock} UTC`,
  all: 'All kept mail',
  html: 'HTML',
  readHtml: 'Read it as HTML',
  messageId: 'Message-ID',
  plain: 'Plain text',
  calendar: 'Calendar part',
} as const;

export const MAIL_AUDIT = {
  retried: (officer: string, subject: string, to: string) =>
    `${officer} had the mail "${subject}" to ${to} sent again.`,
} as const;

export const MAIL_ERRORS = {
  noWords: 'The words of this mail are gone.',
  stoppedProgram: 'Sending it stopped the program.',
} as const;
