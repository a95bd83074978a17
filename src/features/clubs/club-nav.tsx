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

interface Screen {
  path: string;
  label: string;
  icon: NavItem['icon'];
  needs: Permission;
}

/** In the order of the rail; the first four a person may open stand on the phone's bar. */
const SCREENS: Screen[] = [
  { path: 'sit', label: 'Sit', icon: <Armchair />, needs: 'sits.read' },
  { path: 'week', label: 'Week', icon: <CalendarRange />, needs: 'sits.read' },
  { path: 'board', label: 'Board', icon: <ClipboardList />, needs: 'board.read' },
  { path: 'log', label: 'Log', icon: <NotebookPen />, needs: 'log.write' },
  { path: 'my-sits', label: 'My sits', icon: <CalendarCheck />, needs: 'sits.book' },
  { path: 'season', label: 'Season', icon: <ChartNoAxesColumn />, needs: 'report.read' },
  { path: 'draws', label: 'Draws', icon: <Dices />, needs: 'draws.enter' },
  { path: 'chores', label: 'Chores', icon: <Hammer />, needs: 'chores.read' },
  { path: 'stands', label: 'Stands', icon: <TreePine />, needs: 'stands.read' },
  { path: 'ground', label: 'Ground', icon: <MapSign />, needs: 'features.read' },
  { path: 'closures', label: 'Closed days', icon: <CalendarX />, needs: 'closed_days.write' },
  { path: 'calendar', label: 'Calendar', icon: <CalendarDays />, needs: 'feeds.own' },
  { path: 'notices', label: 'Notices', icon: <BellRing />, needs: 'notices.own' },
  { path: 'club', label: 'Club', icon: <Users />, needs: 'club.read' },
];

/** The screens of a club that a person may open. */
export function clubNavItems(slug: string, can: (permission: Permission) => boolean): NavItem[] {
  return SCREENS.filter((screen) => can(screen.needs)).map(({ path, label, icon }) => ({
    href: `/clubs/${slug}/${path}`,
    label,
    icon,
  }));
}
