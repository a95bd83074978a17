/** After a press whose answer never came, where nothing was typed that could be lost. */
export const LOST = 'The server could not be reached. Try again.';
