export const DRAW_BUTTON_WORDS = { lost: 'The server could not be reached. Try again.' } as const;
