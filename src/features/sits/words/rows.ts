/** What the parts of the list with a script of their own say. */

export const BOOK_BUTTON_WORDS = {
  book: 'Book',
  bookWhich: (stand: string) => ` ${stand}`,
  move: 'Move here',
  moveWhich: (stand: string) => `: ${stand}`,
} as const;

export const BACK_WORDS = { backTo: (window: string) => `Back to ${window}` } as const;

export const OLD_LIST_WORDS = {
  listTitle: 'This list may be old',
  weekTitle: 'This week may be old',
  text: 'The server could not be reached. What is shown may be old.',
  again: 'Try again',
} as const;

export const FOLD_WORDS = { fold: 'Fold', unfold: 'Day, weapon, moon' } as const;
