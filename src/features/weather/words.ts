export const WEATHER_WORDS = {
  cannotBeRead: 'The weather cannot be read.',
} as const;
