export const HOURS_WORDS = {
  note: 'Hours an officer credited for work days, and those of chores that were done in these days.',
  empty: 'No hours are credited for these days.',
  chores: 'Go to the chores',
  caption: 'Hours credited by member and kind of work',
  member: 'Member',
  onDays: 'Work days, h',
  forChores: 'Chores, h',
  total: 'All, h',
  all: 'The club',
} as const;
