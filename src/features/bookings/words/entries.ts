/** A sit as an entry of a calendar. */
export const SIT_ENTRY_WORDS = {
  sit: (stand: string) => `Sit: ${stand}`,
  way: (approach: string, parking: string) => `${approach} from ${parking}`,
  wayIn: (way: string) => `Way in: ${way}`,
  guests: (names: string[]) => `Guests: ${names.join(', ')}`,
  note: (note: string) => `Note: ${note}`,
  cancelled: (reason: string) => `Cancelled: ${reason}`,
} as const;
