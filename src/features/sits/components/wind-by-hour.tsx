import { sectorName } from '@/core/sectors';
import { formatSpeed, formatTemp } from '@/core/units';
import { WindBarb } from '@/ui/wind/wind-barb';
import type { ClubView, TimelineView } from '../view-types';
import { HOURS_WORDS } from '../words/detail';
import { shortClock } from '../words/terms';

/** A barb an hour, with speed and temperature below it. */
export function WindByHour({ hours, club }: { hours: TimelineView[]; club: ClubView }) {
  return (
    <ol className="mt-3 flex flex-wrap gap-x-4 gap-y-2 text-center text-sm">
      {hours.map((hour) => (
        <li key={hour.at} className="w-14">
          <span className="block">{shortClock(hour.at, club)}</span>
          {hour.windSpeedMps === null ? (
            <span className="block py-2 text-ink-soft">{HOURS_WORDS.noWind}</span>
          ) : (
            <>
              <WindBarb
                fromDeg={hour.meanFromDeg}
                speedMps={hour.windSpeedMps}
                label={HOURS_WORDS.windOf(
                  hour.meanFromDeg === null ? HOURS_WORDS.variable : sectorName(hour.meanFromDeg),
                )}
                className="mx-auto"
              />
              <span className="block whitespace-nowrap">{formatSpeed(hour.windSpeedMps, club.units)}</span>
            </>
          )}
          {hour.tempC !== null && <span className="block text-ink-soft">{formatTemp(hour.tempC, club.units)}</span>}
        </li>
      ))}
    </ol>
  );
}
