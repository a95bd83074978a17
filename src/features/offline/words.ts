export const WAITING_WORDS = {
  waits: 'Waiting to be sent',
  beingSent: 'Being sent. You can go on.',
  kept: 'Kept on this device and sent when there is a signal. Nobody else sees it yet: say it by voice if it matters now.',
  refused: 'Sent, and not taken',
  pressedAt: (clock: string) => `, pressed at ${clock}`,
  notTaken: (why: string) => `Not taken: ${why}`,
  takeOff: 'Take off this list',
  takeOffWhich: (what: string) => `Take off this list: ${what}`,
  sent: 'Sent',
  sentWhat: (what: string[]) => `${what.join('; ')}.`,
} as const;

export const WAITING_ERRORS = {
  unreadable: 'It was kept by an older Windrest and cannot be sent. Do it anew.',
} as const;
