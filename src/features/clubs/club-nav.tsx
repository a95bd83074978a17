import {
  Armchair,
  BellRing,
  CalendarCheck,
  CalendarDays,
  CalendarRange,
  CalendarX,
  ChartNoAxesColumn,
  ClipboardList,
  Dices,
  Hammer,
  Map as MapSign,
  NotebookPen,
  TreePine,
  Users,
} from 'lucide-react';
import type { Permission } from '@/core/permissions';
import type { NavItem } from '@/ui/nav-links';
import { NAV_WORDS } from './words/club';

interface Screen {
  path: string;
  label: string;
  icon: NavItem['icon'];
  needs: Permission;
}

/** In the order of the rail; the first four a person may open stand on the phone's bar. */
const SCREENS: Screen[] = [
  { path: 'sit', label: NAV_WORDS.sit, icon: <Armchair />, needs: 'sits.read' },
  { path: 'week', label: NAV_WORDS.week, icon: <CalendarRange />, needs: 'sits.read' },
  { path: 'board', label: NAV_WORDS.board, icon: <ClipboardList />, needs: 'board.read' },
  { path: 'log', label: NAV_WORDS.log, icon: <NotebookPen />, needs: 'log.write' },
  { path: 'my-sits', label: NAV_WORDS.mySits, icon: <CalendarCheck />, needs: 'sits.book' },
  { path: 'season', label: NAV_WORDS.season, icon: <ChartNoAxesColumn />, needs: 'report.read' },
  { path: 'draws', label: NAV_WORDS.draws, icon: <Dices />, needs: 'draws.enter' },
  { path: 'chores', label: NAV_WORDS.chores, icon: <Hammer />, needs: 'chores.read' },
  { path: 'stands', label: NAV_WORDS.stands, icon: <TreePine />, needs: 'stands.read' },
  { path: 'ground', label: NAV_WORDS.ground, icon: <MapSign />, needs: 'features.read' },
  { path: 'closures', label: NAV_WORDS.closedDays, icon: <CalendarX />, needs: 'closed_days.write' },
  { path: 'calendar', label: NAV_WORDS.calendar, icon: <CalendarDays />, needs: 'feeds.own' },
  { path: 'notices', label: NAV_WORDS.notices, icon: <BellRing />, needs: 'notices.own' },
  { path: 'club', label: NAV_WORDS.club, icon: <Users />, needs: 'club.read' },
];

/** The screens of a club that a person may open. */
export function clubNavItems(slug: string, can: (permission: Permission) => boolean): NavItem[] {
  return SCREENS.filter((screen) => can(screen.needs)).map(({ path, label, icon }) => ({
    href: `/clubs/${slug}/${path}`,
    label,
    icon,
  }));
}
