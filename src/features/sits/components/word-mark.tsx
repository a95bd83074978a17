import type { Word } from '@/core/verdict-types';
import { Badge, type BadgeLook } from '@/ui/badge';

const LOOKS: Record<Word, BadgeLook> = { Quiet: 'moss', Touchy: 'plain', Loud: 'clay' };

/** The chance of getting in, sitting and getting out unnoticed, in one word. */
export function WordMark({ word }: { word: Word }) {
  return <Badge look={LOOKS[word]}>{word}</Badge>;
}
