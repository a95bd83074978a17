export const MOVEMENT_WORDS = {
  end: (sector: string) => `its ${sector} end`,
  between: (before: string, after: string) => `${before} and ${after}`,
  together: (place: string, other: string) => `${place} and ${other}`,
} as const;
