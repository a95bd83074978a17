import type { Permission } from '@/core/permissions';
import type { NavItem } from '@/ui/nav-links';
import {
  BellSign,
  BoardSign,
  CalendarSign,
  ChoreSign,
  ClosedDaySign,
  DrawSign,
  GroundSign,
  LogSign,
  OwnDaySign,
  PeopleSign,
  SeasonSign,
  SeatSign,
  TreeSign,
  WeekSign,
} from '@/ui/page-signs';
import { NAV_WORDS } from './words/club';

interface Screen {
  path: string;
  label: string;
  icon: NavItem['icon'];
  needs: Permission;
}

/** In the order of the rail; the first four a person may open stand on the phone's bar. */
const SCREENS: Screen[] = [
  { path: 'sit', label: NAV_WORDS.sit, icon: <SeatSign />, needs: 'sits.read' },
  { path: 'week', label: NAV_WORDS.week, icon: <WeekSign />, needs: 'sits.read' },
  { path: 'board', label: NAV_WORDS.board, icon: <BoardSign />, needs: 'board.read' },
  { path: 'log', label: NAV_WORDS.log, icon: <LogSign />, needs: 'log.write' },
  { path: 'my-sits', label: NAV_WORDS.mySits, icon: <OwnDaySign />, needs: 'sits.book' },
  { path: 'season', label: NAV_WORDS.season, icon: <SeasonSign />, needs: 'report.read' },
  { path: 'draws', label: NAV_WORDS.draws, icon: <DrawSign />, needs: 'draws.enter' },
  { path: 'chores', label: NAV_WORDS.chores, icon: <ChoreSign />, needs: 'chores.read' },
  { path: 'stands', label: NAV_WORDS.stands, icon: <TreeSign />, needs: 'stands.read' },
  { path: 'ground', label: NAV_WORDS.ground, icon: <GroundSign />, needs: 'features.read' },
  { path: 'closures', label: NAV_WORDS.closedDays, icon: <ClosedDaySign />, needs: 'closed_days.write' },
  { path: 'calendar', label: NAV_WORDS.calendar, icon: <CalendarSign />, needs: 'feeds.own' },
  { path: 'notices', label: NAV_WORDS.notices, icon: <BellSign />, needs: 'notices.own' },
  { path: 'club', label: NAV_WORDS.club, icon: <PeopleSign />, needs: 'club.read' },
];

/** The screens of a club that a person may open. */
export function clubNavItems(slug: string, can: (permission: Permission) => boolean): NavItem[] {
  return SCREENS.filter((screen) => can(screen.needs)).map(({ path, label, icon }) => ({
    href: `/clubs/${slug}/${path}`,
    label,
    icon,
  }));
}
