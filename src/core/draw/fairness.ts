import { FAIRNESS_WORDS } from '@/core/words/draw';
/**
 * Gini coefficient of a sharing: 0 when all have the same, toward 1 when one has it all. Values are 0 or more. null with
 * nobody, or nothing to share. Mean absolute difference over twice the mean (Sen 1973, On Economic Inequality).
 */
export function gini(values: readonly number[]): number | null {
  const total = values.reduce((sum, value) => sum + value, 0);
  if (values.length === 0 || total <= 0) return null;
  const sorted = [...values].sort((a, b) => a - b);
  const weighted = sorted.reduce((sum, value, index) => sum + (2 * (index + 1) - values.length - 1) * value, 0);
  return weighted / (values.length * total);
}

/** A Gini coefficient in words; the steps are our choice. */
export function fairnessWords(value: number): string {
  if (value < 0.1) return FAIRNESS_WORDS.evenly;
  if (value < 0.25) return FAIRNESS_WORDS.fairly;
  if (value < 0.4) return FAIRNESS_WORDS.unevenly;
  return FAIRNESS_WORDS.fewHands;
}
