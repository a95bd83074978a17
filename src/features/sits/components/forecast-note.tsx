import { Notice } from '@/ui/notices';
import type { ForecastView } from '../view-types';
import { FORECAST_WORDS as WORDS } from '../words/list';
import { ageText } from '../words/terms';

/** How far the forecast may be trusted: a line when all is well, a caution when it is old, and what still holds without one. */
export function ForecastNote({ forecast, now }: { forecast: ForecastView; now: number }) {
  const { state, source, fetchedAt, error } = forecast;
  const age = fetchedAt === null ? '' : ageText(Math.max(0, now - fetchedAt));
  if (state === 'fresh') return <p className="text-ink-soft text-sm">{WORDS.fresh(source, age)}</p>;
  if (state === 'stale') {
    return (
      <Notice level="caution" title={WORDS.oldTitle(age)}>
        {WORDS.old(error)}
      </Notice>
    );
  }
  if (state === 'beyond') return <Notice title={WORDS.beyondTitle}>{WORDS.beyond}</Notice>;
  return (
    <Notice level="caution" title={WORDS.noneTitle}>
      {WORDS.none(error)}
    </Notice>
  );
}
