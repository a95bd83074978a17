/** 'North gate, Creek gate and 2 more' */
export const namesAndMore = (names: string[], more: number) => names.join(', ') + (more > 0 ? ` and ${more} more` : '');

export const TAKEN_NAMES = {
  stand: (name: string) => `There is already a stand called ${name}: choose another name.`,
  parking: (name: string) => `There is already a parking place called ${name}: choose another name.`,
  feature: (name: string) => `There is already a feature called ${name}: choose another name.`,
  approach: (name: string) => `There is already an approach to this stand called ${name}: choose another name.`,
  approachTo: (stand: string, name: string) =>
    `There is already an approach to ${stand} called ${name}: choose another name.`,
} as const;

export const FIELD_ERRORS = {
  name: 'Give it a name.',
  nameLong: (most: number) => `Keep the name to ${most} characters.`,
  day: 'Choose a day.',
} as const;

export const GROUND_ERRORS = {
  memberGone: 'Somebody you named is no longer a member who hunts: choose again.',
  onlyStewardOpens: 'Only a steward or an admin opens a stand again.',
  closureOver: 'This closure is already over: there is nothing to open.',
  somebody: 'Somebody',
  changedSince: (who: string, thing: string, again: string) =>
    `${who} changed ${thing} since you opened it. What you typed is still here: open ${again} in another tab, compare, and type it there.`,
  approachBooked: (approach: string, sits: string) =>
    `Booked sits walk in by ${approach}: ${sits}. Change their way in first.`,
  parkingUsed: (parking: string, approaches: string) =>
    `Approaches begin at ${parking}: ${approaches}. Give them another place first.`,
  standBooked: (stand: string, sits: string) => `${stand} is booked: ${sits}. Cancel or move these sits first.`,
  onlyStewardCloses: 'Only a steward or an admin closes a stand; you may close the whole ground.',
  daysPast: 'These days are past: choose a last day from today on.',
  firstDayOld: 'Choose a first day within the last year.',
} as const;
