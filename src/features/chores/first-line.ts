const REASON_MAX = 160;

/** The first line of an inspection's notes, as it stands beside a closure. */
export function firstLine(notes: string): string {
  return notes.split('\n')[0]?.replace(/\.+$/, '').slice(0, REASON_MAX) ?? '';
}
