import { Notice } from '@/ui/notices';
import type { ForecastView } from '../view-types';
import { ageText } from '../words';

/** How far the forecast may be trusted: a line when all is well, a caution when it is old, and what still holds without one. */
export function ForecastNote({ forecast, now }: { forecast: ForecastView; now: number }) {
  const { state, source, fetchedAt, error } = forecast;
  const age = fetchedAt === null ? '' : ageText(Math.max(0, now - fetchedAt));
  if (state === 'fresh') {
    return (
      <p className="text-ink-soft text-sm">
        Forecast: {source}, fetched {age}.
      </p>
    );
  }
  if (state === 'stale') {
    return (
      <Notice level="caution" title={`The forecast is old: fetched ${age}`}>
        {error ?? 'No newer one has come.'} The list stands on what there is; look at the sky.
      </Notice>
    );
  }
  if (state === 'beyond') {
    return (
      <Notice title="No forecast for this window">
        The forecast does not reach it. Stands are ranked by their arcs, rest and way in alone.
      </Notice>
    );
  }
  return (
    <Notice level="caution" title="No forecast">
      {error ?? 'None has come yet.'} Stands are ranked by their arcs, rest and way in alone.
    </Notice>
  );
}
