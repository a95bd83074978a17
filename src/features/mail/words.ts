export const MAIL_FRAME_WORDS = {
  by: (club: string) => `${club}, by Windrest`,
  orOpen: (url: string) => `Or open ${url}`,
} as const;

export const MAIL_AUDIT = {
  retried: (officer: string, subject: string, to: string) =>
    `${officer} had the mail "${subject}" to ${to} sent again.`,
} as const;

export const MAIL_ERRORS = {
  noWords: 'The words of this mail are gone.',
  stoppedProgram: 'Sending it stopped the program.',
} as const;
