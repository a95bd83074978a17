/** What a member may be mailed about beside what their own bookings bring. */
export const NOTICE_KINDS = [
  'wind_turned',
  'evening_before',
  'rest_over',
  'rules_changed',
  'draw_changed',
  'weekly',
] as const;
export type NoticeKind = (typeof NOTICE_KINDS)[number];

export interface NoticeChoices {
  kinds: NoticeKind[];
  /** Points of quiet (0-100) a booked sit must lose before its member is told. */
  windPoints: number;
  /** The club's clock, 'HH:MM': nothing is mailed from one to the other. Equal: no quiet hours. */
  quietFrom: string;
  quietTo: string;
}

export const WIND_POINTS = [10, 15, 20, 30] as const;

/** Our choice: what touches a booked sit, a draw or a rule is told, the rest is asked for. */
export const DEFAULT_NOTICE_CHOICES: NoticeChoices = {
  kinds: ['wind_turned', 'evening_before', 'rules_changed', 'draw_changed'],
  windPoints: 15,
  quietFrom: '21:30',
  quietTo: '05:00',
};
