/** Class names joined by a space; anything falsy is left out. */
export function joinClasses(...names: (string | false | null | undefined)[]): string {
  return names.filter(Boolean).join(' ');
}
