import { sectorName } from '@/core/sectors';
import { formatDistance } from '@/core/units';
import { CompassMark } from '@/ui/wind/compass-mark';
import type { ClubView, WayView } from '../view-types';
import { clockText, minutesText, pointsText } from '../words';

const percent = (share: number) => `${Math.round(share * 100)} %`;

function walkText(way: WayView, club: ClubView): string {
  const parts = [minutesText(way.walkSeconds)];
  if (way.walkM > 0) parts.push(formatDistance(way.walkM, club.units));
  if (way.bearingDeg !== null) parts.push(`toward ${sectorName(way.bearingDeg)}, ${bearings(way)}`);
  return parts.join(', ');
}

function bearings(way: WayView): string {
  return way.magneticDeg === null
    ? `${way.bearingDeg}° true`
    : `${way.bearingDeg}° true (${way.magneticDeg}° by compass)`;
}

function costText(way: WayView): string {
  const gap = Math.round(way.cost) === 0 ? 'as good' : `${pointsText(way.cost)} points`;
  return `${gap}, quiet ${Math.round(way.quiet)}${way.worst ? `; most at ${way.worst.name}` : ''}`;
}

/** The best way and time of going in, then what each other one costs. */
export function WaysIn({ ways, club }: { ways: WayView[]; club: ClubView }) {
  const [best, ...others] = ways;
  if (!best) return <p>No way in is drawn for this stand, so a middling walk is assumed. A steward can add one.</p>;
  const clock = (at: number) => clockText(at, club);
  return (
    <>
      <div className="flex gap-3">
        {best.bearingDeg !== null && (
          <CompassMark
            bearingDeg={best.bearingDeg}
            label={`Walk toward ${sectorName(best.bearingDeg)}`}
            size={36}
            className="mt-1 shrink-0"
          />
        )}
        <div>
          <p>
            <span className="font-semibold">{best.name}</span>
            {best.parkingName && ` from ${best.parkingName}`}, {best.entry}
          </p>
          {best.passed && <p className="font-semibold text-clay">It is too late to walk in by it unheard.</p>}
          <p>
            Leave by <b>{clock(best.leaveBy)}</b>, in by <b>{clock(best.inBy)}</b>
          </p>
          <p>Walk {walkText(best, club)}</p>
          <p className="text-ink-soft text-sm">
            Chance of alerting deer: walking in {percent(best.inChance)}, walking out {percent(best.outChance)}
            {best.worst && `, most of it at ${best.worst.name}`}.
          </p>
        </div>
      </div>
      {others.length > 0 && (
        <table className="mt-3 w-full text-sm">
          <caption className="pb-1 text-left text-ink-soft">Other ways and times, and what they cost</caption>
          <thead className="sr-only">
            <tr>
              <th scope="col">Way and time</th>
              <th scope="col">In by</th>
              <th scope="col">Cost</th>
            </tr>
          </thead>
          <tbody>
            {others.map((way) => (
              <tr key={`${way.approachId} ${way.inBy}`} className="border-rule border-t align-top">
                <th scope="row" className="py-1 pr-3 text-left font-normal">
                  {way.name}, {way.entry}
                </th>
                <td className="whitespace-nowrap py-1 pr-3">{clock(way.inBy)}</td>
                <td className="py-1">{costText(way)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </>
  );
}
