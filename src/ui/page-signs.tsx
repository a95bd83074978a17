import { drawn } from './signs';

/** Signs of the pages on a phone's bar and in its list. Apart from the rest: only the server draws them. */
export const SeatSign = drawn('M7 3v9h10V3M7 12l-2 9M17 12l2 9M7 8h10M6 17h12');
export const WeekSign = drawn('M4 5h16v15H4zM4 10h16M8 3v4M16 3v4M8 14h8');
export const BoardSign = drawn('M5 5h14v16H5zM9 3h6v4H9zM8.5 11.5h7M8.5 15.5h7');
export const LogSign = drawn('M6 3h12v18H6zM3.5 7H8M3.5 12H8M3.5 17H8M11 8h4M11 12h4');
export const OwnDaySign = drawn('M4 5h16v15H4zM4 10h16M8 3v4M16 3v4M9 15l2 2l4-4');
export const SeasonSign = drawn('M4 20h16M7 20v-6M12 20V5M17 20v-9');
export const DrawSign = drawn('M4 4h16v16H4zM8.5 8.5v.01M15.5 8.5v.01M12 12v.01M8.5 15.5v.01M15.5 15.5v.01');
export const ChoreSign = drawn('M4 20l9-9M11 5l3-2l7 7l-2 3zM13 7l4 4');
export const TreeSign = drawn('M12 3l5 6h-2.5l4 5H5.5l4-5H7zM12 14v7');
export const GroundSign = drawn('M3 6l6-2l6 2l6-2v14l-6 2l-6-2l-6 2zM9 4v14M15 6v14');
export const ClosedDaySign = drawn('M4 5h16v15H4zM4 10h16M8 3v4M16 3v4M10 13.5l4 4M14 13.5l-4 4');
export const CalendarSign = drawn('M4 5h16v15H4zM4 10h16M8 3v4M16 3v4M8 14v.01M12 14v.01M16 14v.01M8 17v.01M12 17v.01');
export const BellSign = drawn('M6 17V11a6 6 0 0 1 12 0v6l1.5 1.5h-15zM10 21h4M12 3v2');
export const PeopleSign = drawn(
  'M9 11a3.5 3.5 0 1 0 0-7a3.5 3.5 0 0 0 0 7M2.5 20a6.5 6.5 0 0 1 13 0M15.5 4.5a3.5 3.5 0 0 1 0 6M18 14a6.5 6.5 0 0 1 3.5 6',
);
