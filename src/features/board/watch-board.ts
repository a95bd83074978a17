import { watchQuery } from '@/ui/watch-query';
import { boardQuery } from './queries';
import type { Board } from './reads';

export const watchBoard = (club: string) => watchQuery<Board>(boardQuery(club), (board) => board.at);
