import type { GroundWork } from '@/core/ground-work';

export const WORK_WORDS: Record<GroundWork, string> = {
  mock_scrape: 'Mock scrapes',
  water: 'Water holes',
  bait: 'Bait and minerals',
  cutting: 'Cutting and trimming',
  planting: 'Planting',
};

export const WORK_RULE_WORDS = {
  group: 'Work on the ground',
  note: 'What the state or the landowner says of each kind of work, with where it stands and the day you read it. Shown beside findings of the set-up check and chores made of them; state law and the landowner decide. Leave all three of a kind blank for none.',
  none: 'No rule is written down.',
} as const;
