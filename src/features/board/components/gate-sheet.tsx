import type { ReactNode } from 'react';
import { SidewaysBox } from '@/ui/figure-table';
import { WindBarb } from '@/ui/wind/wind-barb';
import type { GateSheet } from '../gate-sheet/read-gate-sheet';
import { GATE_SITS_WORDS as SITS, GATE_WIND_WORDS as WIND, GATE_SHEET_WORDS as WORDS } from '../words/gate-sheet';
import { SketchMap } from './sketch-map';

const WALK_UPS = 5;
const CELL = 'border border-ink px-1.5 py-1 align-top';
const HEAD = `${CELL} text-left font-semibold text-xs uppercase tracking-wide`;

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="mt-4 break-inside-avoid">
      <h2 className="mb-1 font-serif text-lg leading-tight">{title}</h2>
      {children}
    </section>
  );
}

function SitsTable({ sheet }: { sheet: GateSheet }) {
  const blanks = Array.from({ length: WALK_UPS }, (_, index) => index + 1);
  return (
    <SidewaysBox label={SITS.region}>
      <table className="w-full min-w-176 border-collapse text-sm leading-snug print:min-w-0">
        <caption className="sr-only">{SITS.caption}</caption>
        <thead>
          <tr>
            <th className={HEAD}>{SITS.stand}</th>
            <th className={HEAD}>{SITS.who}</th>
            <th className={HEAD}>{SITS.window}</th>
            <th className={HEAD}>{SITS.way}</th>
            <th className={HEAD}>{SITS.backBy}</th>
            <th className={`${HEAD} w-16`}>{SITS.in}</th>
            <th className={`${HEAD} w-16`}>{SITS.out}</th>
          </tr>
        </thead>
        <tbody>
          {sheet.sits.map((sit) => (
            <tr key={sit.id}>
              <th scope="row" className={`${CELL} text-left font-semibold`}>
                {sheet.ground ? SITS.numbered(sit.standNumber, sit.standName) : sit.standName}
              </th>
              <td className={CELL}>
                {SITS.withGuests(sit.who, sit.guests)}
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
                <span className="sr-only">{SITS.blank(blank)}</span>
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
    </SidewaysBox>
  );
}

function WindTable({ winds }: { winds: GateSheet['winds'] }) {
  const rows = [
    { label: WIND.wind, of: (wind: GateSheet['winds'][number]) => wind.wind },
    { label: WIND.gusts, of: (wind: GateSheet['winds'][number]) => wind.gust },
    { label: WIND.air, of: (wind: GateSheet['winds'][number]) => wind.temp },
    { label: WIND.rain, of: (wind: GateSheet['winds'][number]) => wind.rain },
  ];
  return (
    <SidewaysBox label={WIND.region}>
      <table className="w-full hours-table min-w-208 table-fixed border-collapse text-center text-xs leading-tight print:min-w-0">
        <caption className="sr-only">{WIND.caption}</caption>
        <thead>
          <tr>
            <th className="w-10 border border-ink px-0.5 py-0.5 text-left">{WIND.hour}</th>
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
              {WIND.barb}
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
    </SidewaysBox>
  );
}

/** One sheet of paper in black and white, for the gate. */
export function GateSheetView({ sheet }: { sheet: GateSheet }) {
  const { ground } = sheet;
  return (
    <article className="text-ink">
      <header className="flex flex-wrap items-baseline justify-between gap-x-6 border-ink border-b-2 pb-1">
        <p className="font-semibold font-serif text-2xl">{sheet.dayText}</p>
        <p>{WORDS.made(sheet.clubName, sheet.madeText)}</p>
      </header>
      <p className="mt-2 border-2 border-ink px-2 py-1 font-semibold text-sm">{WORDS.noRescue}</p>
      <Part title={WORDS.who}>
        {sheet.sits.length === 0 && <p className="mb-2">{WORDS.nobody}</p>}
        <SitsTable sheet={sheet} />
      </Part>
      <div className="grid gap-x-8 sm:grid-cols-2 print:grid-cols-2">
        <Part title={WORDS.closed}>
          {sheet.closed.length === 0 ? (
            <p className="text-sm">{WORDS.nothingClosed}</p>
          ) : (
            <ul className="list-disc pl-5 text-sm">
              {sheet.closed.map((line) => (
                <li key={line}>{line}</li>
              ))}
            </ul>
          )}
        </Part>
        <Part title={WORDS.sun}>
          <p className="text-sm">{sheet.sun}</p>
          {sheet.light.map((line) => (
            <p key={line} className="mt-1 text-sm">
              {line}
            </p>
          ))}
          {sheet.light.length === 0 && <p className="mt-1 text-sm">{WORDS.noLight}</p>}
        </Part>
      </div>
      <Part title={WORDS.wind}>
        {sheet.winds.length > 0 && <WindTable winds={sheet.winds} />}
        <p className="mt-1 text-sm">
          {sheet.forecastText}
          {sheet.winds.length > 0 && WORDS.barb}
        </p>
      </Part>
      {ground && (
        <Part title={WORDS.ground}>
          <SketchMap sketch={ground.sketch} stands={ground.stands} />
          <ul className="mt-1 columns-2 gap-6 text-sm sm:columns-4 print:columns-4">
            {ground.stands.map(({ id, number, name, state }) => (
              <li key={id}>{WORDS.stand(number, name, state)}</li>
            ))}
          </ul>
          <p className="mt-1 text-sm">{WORDS.legend}</p>
        </Part>
      )}
    </article>
  );
}
