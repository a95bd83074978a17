/** What a sit holds, in a sentence. */
export const SIT_WINDOW_WORDS = { morning: 'morning', evening: 'evening', all_day: 'all day' } as const;
