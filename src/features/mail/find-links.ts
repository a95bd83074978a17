export type TextPiece = { kind: 'text' | 'link'; text: string };

/** Cuts plain text into words and web addresses; joined again the pieces are the text. */
export function findLinks(text: string): TextPiece[] {
  const pieces: TextPiece[] = [];
  let from = 0;
  for (const found of text.matchAll(/https?:\/\/[^\s<>"]+[^\s<>".,;:!?)]/g)) {
    if (found.index > from) pieces.push({ kind: 'text', text: text.slice(from, found.index) });
    pieces.push({ kind: 'link', text: found[0] });
    from = found.index + found[0].length;
  }
  if (from < text.length) pieces.push({ kind: 'text', text: text.slice(from) });
  return pieces;
}
