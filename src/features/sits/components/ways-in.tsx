import { sectorName } from '@/core/sectors';
import { formatDistance } from '@/core/units';
import { CompassMark } from '@/ui/wind/compass-mark';
import type { ClubView, WayView } from '../view-types';
import { WAYS_WORDS } from '../words/detail';
import { clockText, minutesText, pointsText } from '../words/terms';

const percent = (share: number) => `${Math.round(share * 100)} %`;

const walkText = (way: WayView, club: ClubView) =>
  WAYS_WORDS.walk({
    time: minutesText(way.walkSeconds),
    length: way.walkM > 0 ? formatDistance(way.walkM, club.units) : null,
    direction: way.bearingDeg === null ? null : sectorName(way.bearingDeg),
    bearing: WAYS_WORDS.bearing(way.bearingDeg, way.magneticDeg),
  });

const costText = (way: WayView) =>
  WAYS_WORDS.costs(
    Math.round(way.cost) === 0 ? null : pointsText(way.cost),
    Math.round(way.quiet),
    way.worst?.name ?? null,
  );

/** The best way and time of going in, then what each other one costs. */
export function WaysIn({ ways, club }: { ways: WayView[]; club: ClubView }) {
  const [best, ...others] = ways;
  if (!best) return <p>{WAYS_WORDS.none}</p>;
  const clock = (at: number) => clockText(at, club);
  return (
    <>
      <div className="flex gap-3">
        {best.bearingDeg !== null && (
          <CompassMark
            bearingDeg={best.bearingDeg}
            label={WAYS_WORDS.toward(sectorName(best.bearingDeg))}
            size={36}
            className="mt-1 shrink-0"
          />
        )}
        <div>
          <p>
            <span className="font-semibold">{best.name}</span>
            {WAYS_WORDS.fromParking(best.parkingName, best.entry)}
          </p>
          {best.passed && <p className="font-semibold text-clay">{WAYS_WORDS.tooLate}</p>}
          <p>
            {WAYS_WORDS.leaveBy}
            <b>{clock(best.leaveBy)}</b>
            {WAYS_WORDS.inBy}
            <b>{clock(best.inBy)}</b>
          </p>
          <p>{walkText(best, club)}</p>
          <p className="text-ink-soft text-sm">
            {WAYS_WORDS.chance(percent(best.inChance), percent(best.outChance), best.worst?.name ?? null)}
          </p>
        </div>
      </div>
      {others.length > 0 && (
        <table className="mt-3 w-full text-sm">
          <caption className="pb-1 text-left text-ink-soft">{WAYS_WORDS.others}</caption>
          <thead className="sr-only">
            <tr>
              <th scope="col">{WAYS_WORDS.wayAndTime}</th>
              <th scope="col">{WAYS_WORDS.inByHead}</th>
              <th scope="col">{WAYS_WORDS.cost}</th>
            </tr>
          </thead>
          <tbody>
            {others.map((way) => (
              <tr key={`${way.approachId} ${way.inBy}`} className="border-rule border-t align-top">
                <th scope="row" className="py-1 pr-3 text-left font-normal">
                  {WAYS_WORDS.nameAndTime(way.name, way.entry)}
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
