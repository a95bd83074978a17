export const SIT_AUDIT = {
  booked: (stand: string, member: string, when: string) => `Booked ${stand} for ${member}: ${when}.`,
  cancelled: (member: string, stand: string, when: string) => `Cancelled the sit of ${member} at ${stand}: ${when}.`,
  changed: (member: string, stand: string, when: string, standNow: string, whenNow: string) =>
    `Changed the sit of ${member} at ${stand}, ${when}: now ${standNow}, ${whenNow}.`,
} as const;
