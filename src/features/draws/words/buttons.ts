import { LOST } from '@/ui/words/lost';

export const DRAW_BUTTON_WORDS = { lost: LOST } as const;
