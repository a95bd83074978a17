export const QUOTA_WORDS = {
  deer: {
    any: (count: number) => `${count} deer`,
    antlered: (count: number) => `${count} antlered deer`,
    antlerless: (count: number) => `${count} antlerless deer`,
  },
  /** `deer` is one of the above. */
  per: {
    club: (deer: string) => `At most ${deer} in the whole club`,
    member: (deer: string) => `At most ${deer} a member, guests counted on their sponsor`,
    member_guests: (deer: string) => `At most ${deer} for all guests of a member together`,
  },
} as const;

/** A quota that is met, as the reader or somebody the reader books for is told. */
export const QUOTA_MET_WORDS = {
  met: (limit: string, deer: string, taken: number) => `${limit} of ${deer} this season is met (${taken} taken).`,
  deer: QUOTA_WORDS.deer,
  club: "The club's limit",
  member: {
    own: 'Your limit',
    sponsor: 'Your deer count on your sponsor, whose limit',
    guest: (name: string) => `The deer of ${name} count on their sponsor, whose limit`,
    member: (name: string) => `${name}'s limit`,
  },
  member_guests: {
    own: 'The limit for your guests',
    sponsor: "The limit for your sponsor's guests",
    guest: (name: string) => `The limit for the guests of ${name}'s sponsor`,
    member: (name: string) => `The limit for the guests of ${name}`,
  },
} as const;
