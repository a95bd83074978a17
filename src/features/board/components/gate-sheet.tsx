import type { ReactNode } from 'react';
import { WindBarb } from '@/ui/wind/wind-barb';
import type { GateSheet } from '../gate-sheet/read-gate-sheet';
import { SketchMap } from './sketch-map';

const WALK_UPS = 5;
const CELL = 'border border-ink px-1.5 py-1 align-top';
const HEAD = `${CELL} text-left font-semibold text-[0.7rem] uppercase tracking-wide`;

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="mt-4 break-inside-avoid">
      <h2 className="mb-1 font-serif text-lg leading-tight">{title}</h2>
      {children}
    </section>
  );
}

/** A wide table scrolls by itself on a phone; on paper it has all the room there is. */
function Wide({ label, children }: { label: string; children: ReactNode }) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reached by keyboard
    <section aria-label={label} tabIndex={0} className="overflow-x-auto print:overflow-visible">
      {children}
    </section>
  );
}

function SitsTable({ sheet }: { sheet: GateSheet }) {
  const blanks = Array.from({ length: WALK_UPS }, (_, index) => `walk-up ${index + 1}`);
  return (
    <Wide label="Who is where, as a table">
      <table className="w-full min-w-[44rem] border-collapse text-sm leading-snug print:min-w-0">
        <caption className="sr-only">Booked sits, then blank lines for walk-ups</caption>
        <thead>
          <tr>
            <th className={HEAD}>Stand</th>
            <th className={HEAD}>Who</th>
            <th className={HEAD}>Window</th>
            <th className={HEAD}>Parking, way in</th>
            <th className={HEAD}>Back by</th>
            <th className={`${HEAD} w-16`}>In</th>
            <th className={`${HEAD} w-16`}>Out</th>
          </tr>
        </thead>
        <tbody>
          {sheet.sits.map((sit) => (
            <tr key={sit.id}>
              <th scope="row" className={`${CELL} text-left font-semibold`}>
                {sheet.ground && `${sit.standNumber}. `}
                {sit.standName}
              </th>
              <td className={CELL}>
                {sit.who}
                {sit.guests && `, with ${sit.guests}`}
                <span className="block">{sit.weapon}</span>
              </td>
              <td className={CELL}>
                {sit.windowText}
                <span className="block whitespace-nowrap">{sit.timeText}</span>
              </td>
              <td className={CELL}>{[sit.parking, sit.wayIn].filter(Boolean).join(', ')}</td>
              <td className={`${CELL} whitespace-nowrap`}>{sit.backBy}</td>
              <td className={CELL} />
              <td className={CELL} />
            </tr>
          ))}
          {blanks.map((blank) => (
            <tr key={blank} className="h-8">
              <th scope="row" className={CELL}>
                <span className="sr-only">Blank line for a {blank}</span>
              </th>
              <td className={CELL} />
              <td className={CELL} />
              <td className={CELL} />
              <td className={CELL} />
              <td className={CELL} />
              <td className={CELL} />
            </tr>
          ))}
        </tbody>
      </table>
    </Wide>
  );
}

function WindTable({ winds }: { winds: GateSheet['winds'] }) {
  const rows = [
    { label: 'Wind', of: (wind: GateSheet['winds'][number]) => wind.wind },
    { label: 'Gusts', of: (wind: GateSheet['winds'][number]) => wind.gust },
    { label: 'Air', of: (wind: GateSheet['winds'][number]) => wind.temp },
    { label: 'Rain', of: (wind: GateSheet['winds'][number]) => wind.rain },
  ];
  return (
    <Wide label="Wind by hour, as a table">
      <table className="w-full min-w-[52rem] table-fixed border-collapse text-center text-xs leading-tight print:min-w-0 print:text-[6.5pt]">
        <caption className="sr-only">Wind by hour at the club</caption>
        <thead>
          <tr>
            <th className="w-10 border border-ink px-0.5 py-0.5 text-left">Hour</th>
            {winds.map(({ at, clock }) => (
              <th key={at} className="border border-ink px-0.5 py-0.5">
                {clock}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          <tr>
            <th scope="row" className="border border-ink px-0.5 text-left">
              Barb
            </th>
            {winds.map(({ at, fromDeg, speedMps, wind }) => (
              <td key={at} className="border border-ink">
                <WindBarb fromDeg={fromDeg} speedMps={speedMps} label={wind} size={26} className="mx-auto" />
              </td>
            ))}
          </tr>
          {rows.map(({ label, of }) => (
            <tr key={label}>
              <th scope="row" className="border border-ink px-0.5 text-left">
                {label}
              </th>
              {winds.map((wind) => (
                <td key={wind.at} className="border border-ink px-0.5 py-0.5">
                  {of(wind)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </Wide>
  );
}

const STATE = { free: '', booked: ' (booked)', closed: ' (closed)' } as const;

/** One sheet of paper in black and white, for the gate. */
export function GateSheetView({ sheet }: { sheet: GateSheet }) {
  const { ground } = sheet;
  return (
    <article className="text-ink">
      <header className="flex flex-wrap items-baseline justify-between gap-x-6 border-ink border-b-2 pb-1">
        <p className="font-semibold font-serif text-2xl">{sheet.dayText}</p>
        <p>
          {sheet.clubName}. {sheet.madeText}
        </p>
      </header>
      <p className="mt-2 border-2 border-ink px-2 py-1 font-semibold text-sm">
        This sheet and Windrest are no rescue service. When somebody is missing or hurt, call the emergency number.
      </p>
      <Part title="Who is where">
        {sheet.sits.length === 0 && <p className="mb-2">Nobody has booked this day. Walk-ups sign below.</p>}
        <SitsTable sheet={sheet} />
      </Part>
      <div className="grid gap-x-8 sm:grid-cols-2 print:grid-cols-2">
        <Part title="Closed">
          {sheet.closed.length === 0 ? (
            <p className="text-sm">Nothing is closed.</p>
          ) : (
            <ul className="list-disc pl-5 text-sm">
              {sheet.closed.map((line) => (
                <li key={line}>{line}</li>
              ))}
            </ul>
          )}
        </Part>
        <Part title="Sun and the club's light">
          <p className="text-sm">{sheet.sun}</p>
          {sheet.light.map((line) => (
            <p key={line} className="mt-1 text-sm">
              {line}
            </p>
          ))}
          {sheet.light.length === 0 && (
            <p className="mt-1 text-sm">The club has written down no rule of light. State law decides.</p>
          )}
        </Part>
      </div>
      <Part title="Wind by hour">
        {sheet.winds.length > 0 && <WindTable winds={sheet.winds} />}
        <p className="mt-1 text-sm">
          {sheet.forecastText}
          {sheet.winds.length > 0 && ' The barb points to where the wind comes from; look at the trees all the same.'}
        </p>
      </Part>
      {ground && (
        <Part title="The ground">
          <SketchMap sketch={ground.sketch} stands={ground.stands} />
          <ul className="mt-1 columns-2 gap-6 text-sm sm:columns-4 print:columns-4">
            {ground.stands.map(({ id, number, name, state }) => (
              <li key={id}>
                {number}. {name}
                {STATE[state]}
              </li>
            ))}
          </ul>
          <p className="mt-1 text-sm">
            Black: booked. Crossed: closed. P: parking. Thin broken lines: ways in. Not to be measured from.
          </p>
        </Part>
      )}
    </article>
  );
}
