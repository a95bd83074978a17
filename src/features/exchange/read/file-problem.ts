/** Why a whole file cannot be read, in words for the person who chose it. */
export class FileProblem extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'FileProblem';
  }
}

/** The line of a text that a position lies in, counted from 1. */
export function lineAt(text: string, position: number): number {
  let line = 1;
  for (let i = text.indexOf('\n'); i >= 0 && i < position; i = text.indexOf('\n', i + 1)) line += 1;
  return line;
}
