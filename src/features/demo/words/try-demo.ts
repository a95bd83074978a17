import { LOST } from '@/ui/words/lost';

export const TRY_DEMO_WORDS = {
  open: 'Try the demo club',
  opening: 'Opening the demo…',
  lost: LOST,
} as const;
