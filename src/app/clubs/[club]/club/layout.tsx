import { CLUB_TABS_WORDS } from '@/features/clubs/words/club';
import { CLUB_LAYOUT_WORDS } from '@/features/clubs/words/pages';
import { type FolderProps, PagesWithTabs, type Tab } from '../pages-with-tabs';

const TABS: Tab[] = [
  { path: '', label: CLUB_LAYOUT_WORDS.club, needs: 'club.read' },
  { path: '/rules', label: CLUB_LAYOUT_WORDS.rules, needs: 'club.read' },
  { path: '/members', label: CLUB_LAYOUT_WORDS.members, needs: 'members.read' },
  { path: '/audit', label: CLUB_LAYOUT_WORDS.auditLog, needs: 'audit.read' },
  { path: '/mail', label: CLUB_LAYOUT_WORDS.mail, needs: 'mail.read' },
  { path: '/jobs', label: CLUB_LAYOUT_WORDS.jobs, needs: 'jobs.read' },
];

export default function ClubLayout(props: FolderProps) {
  return <PagesWithTabs {...props} folder="club" label={CLUB_TABS_WORDS.label} tabs={TABS} />;
}
