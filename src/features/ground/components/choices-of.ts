/** A table of words as the choices of a control. */
export function choicesOf<Key extends string>(words: Record<Key, string>): { value: string; label: string }[] {
  return Object.entries<string>(words).map(([value, label]) => ({ value, label }));
}
