import { SEASON_WORDS } from '@/features/logs/words/sightings';
import { type FolderProps, PagesWithTabs, type Tab } from '../pages-with-tabs';

const TABS: Tab[] = [
  { path: '', label: SEASON_WORDS.report, needs: 'report.read' },
  { path: '/sightings', label: SEASON_WORDS.sightings, needs: 'log.read' },
  { path: '/harvest', label: SEASON_WORDS.harvest, needs: 'harvest.read' },
  { path: '/setup', label: SEASON_WORDS.setup, needs: 'features.read' },
  { path: '/coverage', label: SEASON_WORDS.coverage, needs: 'features.read' },
  { path: '/movement', label: SEASON_WORDS.movement, needs: 'features.read' },
  { path: '/learning', label: SEASON_WORDS.learning, needs: 'log.read_all' },
];

export default function SeasonLayout(props: FolderProps) {
  return <PagesWithTabs {...props} folder="season" label={SEASON_WORDS.tabs} tabs={TABS} />;
}
