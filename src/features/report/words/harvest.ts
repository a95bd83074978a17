export const HARVEST_WORDS = {
  note: (fromDay: string, toDay: string) =>
    `Quotas are the club’s own and are counted over its whole year, ${fromDay} to ${toDay}. State law decides.`,
  taken: (antlered: number, antlerless: number, label: string) =>
    `${antlered} antlered and ${antlerless} antlerless deer are written down for ${label}.`,
  noQuota: 'The club has set no quota.',
  setQuota: 'Set quotas in the rules',
  caption: 'Quotas with the club’s and your own count',
  quota: 'Quota',
  count: 'Taken',
  takenOf: (taken: number, most: number) => `${taken} of ${most}`,
  left: 'Left',
  state: 'State',
  met: 'Met',
  open: 'Open',
  metBy: (members: number) =>
    `Your own count. ${members === 0 ? 'No member has met it.' : members === 1 ? '1 member has met it.' : `${members} members have met it.`}`,
} as const;
