import { ButtonLink } from '@/ui/button';
import { Badge, Section } from '@/ui/page-parts';
import { CompassMark } from '@/ui/wind/compass-mark';
import { SitTimeline } from '@/ui/wind/sit-timeline';
import { WindBarb } from '@/ui/wind/wind-barb';
import { WindRose } from '@/ui/wind/wind-rose';
import { WindStrip } from '@/ui/wind/wind-strip';
import { ARCS, clock, ROWS, START, STEPS, sharesAbout, TWO_ARCS } from './sample-wind';

const SITS = [
  {
    name: 'Heron Pond ladder',
    word: 'Quiet',
    arcs: ARCS,
    rows: ROWS,
    text: 'NW holds 84 % until 7:30; walk in by Creek Gate, in by 6:05',
  },
  {
    name: 'Lower Oats box',
    word: 'Touchy',
    arcs: TWO_ARCS,
    rows: [{ at: START, shares: sharesAbout(70, 38) }],
    text: 'ENE wanders; bedding on Tanner Ridge is winded one sit in three',
  },
  {
    name: 'Split Beech',
    word: 'Loud',
    arcs: [{ fromDeg: 168.75, toDeg: 236.25 }],
    rows: [{ at: START, shares: sharesAbout(0, 400) }],
    text: 'Light air from anywhere until sun-up',
  },
  {
    name: 'Old Orchard blind',
    word: 'Touchy',
    arcs: ARCS,
    rows: [{ at: START, shares: null }],
    text: 'No forecast; ranked by way in and rest alone',
  },
];

const KNOTS = [0, 5, 10, 15, 25, 50, 65];

export function ShowWind() {
  return (
    <>
      <Section title="Wind strip in a list">
        <ol className="divide-y divide-rule border-rule border-y">
          {SITS.map((sit, rank) => (
            <li
              key={sit.name}
              className="grid grid-cols-[2rem_minmax(0,1fr)] gap-x-2 gap-y-1 py-3 sm:grid-cols-[2rem_minmax(0,1fr)_auto]"
            >
              <span className="font-serif text-ink-soft text-xl">{rank + 1}</span>
              <div className="min-w-0">
                <p className="flex flex-wrap items-baseline gap-x-3">
                  <span className="font-semibold font-serif text-lg">{sit.name}</span>
                  <Badge look={sit.word === 'Quiet' ? 'moss' : sit.word === 'Loud' ? 'clay' : 'plain'}>
                    {sit.word}
                  </Badge>
                </p>
                <WindStrip arcs={sit.arcs} rows={sit.rows} className="my-1.5" />
                <p className="text-ink-soft">{sit.text}</p>
              </div>
              <div className="col-start-2 sm:col-start-3">
                <ButtonLink href="/dev/ui" look={rank === 0 ? 'primary' : 'plain'}>
                  Book
                </ButtonLink>
              </div>
            </li>
          ))}
        </ol>
      </Section>
      <div className="mt-8 grid gap-x-10 gap-y-8 lg:grid-cols-2">
        <div>
          <Section title="Wind strip on a page">
            <WindStrip variant="page" arcs={ARCS} rows={ROWS} formatClock={clock} />
          </Section>
        </div>
        <div>
          <Section title="The sit by half hours">
            <SitTimeline steps={STEPS} formatClock={clock} marks={[{ at: START + 4_500_000, label: 'sunrise 6:45' }]} />
          </Section>
        </div>
      </div>
      <Section title="Wind rose, barbs, bearings">
        <div className="flex flex-wrap items-center gap-8">
          <WindRose shares={sharesAbout(310, 45).map((share) => share * 0.92)} calmShare={0.08} />
          <div className="flex flex-wrap gap-4">
            {KNOTS.map((knots, index) => (
              <figure key={knots} className="text-center text-sm">
                <WindBarb fromDeg={250 + index * 15} speedMps={knots * 0.51444} />
                <figcaption>{knots} kt</figcaption>
              </figure>
            ))}
            <figure className="text-center text-sm">
              <WindBarb fromDeg={null} speedMps={2.6} />
              <figcaption>variable</figcaption>
            </figure>
          </div>
          <div className="flex gap-3">
            {[0, 67.5, 202.5, null].map((bearing) => (
              <CompassMark key={bearing} bearingDeg={bearing} size={32} />
            ))}
          </div>
        </div>
      </Section>
    </>
  );
}
