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
