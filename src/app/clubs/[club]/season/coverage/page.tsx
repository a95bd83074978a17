import { formatDay } from '@/core/day-time';
import { PointBars } from '@/features/coverage/components/point-bars';
import { TrialMap } from '@/features/coverage/components/trial-map';
import { readCoverageAsk } from '@/features/coverage/coverage-schema';
import { readCoverage } from '@/features/coverage/reads';
import { MONTH_NAMES } from '@/features/coverage/words';
import { now } from '@/server/clock';
import { clubPage } from '@/server/doors';
import { Button, ButtonLink } from '@/ui/button';
import { EmptyState, Notice } from '@/ui/notices';
import { PageTitle, Section } from '@/ui/page-parts';
import { RowHead, Table, TBody, Td, THead, Th, Tr } from '@/ui/table';
import { Select, TextInput } from '@/ui/text-inputs';
import { WindRose } from '@/ui/wind/wind-rose';

export const metadata = { title: 'Wind coverage' };

const percent = (share: number | null) => (share === null ? '–' : `${Math.round(share * 100)} %`);
const TITLES = { morning: 'Mornings', evening: 'Evenings' } as const;

export default clubPage('features.read', async ({ scope, search }) => {
  const { slug, name } = scope.club;
  const ask = readCoverageAsk(search);
  const view = await readCoverage(scope, ask, now());
  const page = `/clubs/${slug}/season/coverage`;
  const hasTrial = view.stands.some(({ trial }) => trial);
  const at = ask.lat !== undefined && ask.lon !== undefined ? { lat: ask.lat, lon: ask.lon } : null;
  const gain = view.windows.map((w) => `${percent(w.added)} of ${w.window}s`).join(' and ');
  const lead =
    view.fromDay && view.toDay
      ? `${view.source}: ${formatDay(view.fromDay, true)} to ${formatDay(view.toDay, true)}, hour by hour, in the club’s window hours.`
      : 'Which winds of a season the stands cover, and which nobody can sit on.';
  return (
    <>
      <PageTitle over={name} title="Wind coverage" lead={lead} />
      {view.windows.length === 0 ? (
        <EmptyState title="No hours to count yet" action={<ButtonLink href={page}>Look again</ButtonLink>}>
          {view.error ?? 'The hours known lie outside the club’s window hours.'}
        </EmptyState>
      ) : (
        <>
          {view.standCount === 0 && (
            <Notice title="No stands yet" className="mb-6">
              Nothing is covered until a stand has good winds. Try one below.
            </Notice>
          )}
          <div className="grid gap-x-10 lg:grid-cols-2">
            {view.windows.map((w) => (
              <div key={w.window}>
                <Section
                  title={TITLES[w.window]}
                  note={`${w.hours} hours. ${percent(w.covered)} of the wind is covered${hasTrial ? `, ${percent(w.added)} more with the trial` : ''}. Calm or variable for ${percent(w.calmShare)} of the hours: no arc covers those.`}
                >
                  <div className="mb-4 flex justify-center">
                    <WindRose
                      shares={w.points.map((p) => p.share * (1 - w.calmShare))}
                      calmShare={w.calmShare}
                      size={220}
                    />
                  </div>
                  <PointBars points={w.points} label={`${TITLES[w.window]} by compass point`} trial={hasTrial} />
                </Section>
                <div className="mt-6">
                  <Table caption={`${TITLES[w.window]} by month`}>
                    <THead>
                      <Th>Month</Th>
                      <Th align="right">Hours</Th>
                      <Th align="right">Covered</Th>
                      {hasTrial && <Th align="right">Trial adds</Th>}
                      <Th>Most uncovered</Th>
                    </THead>
                    <TBody>
                      {w.months.map((month) => (
                        <Tr key={month.month}>
                          <RowHead>{MONTH_NAMES[month.month - 1]}</RowHead>
                          <Td label="Hours" align="right">
                            {month.hours}
                          </Td>
                          <Td label="Covered" align="right">
                            {percent(month.covered)}
                          </Td>
                          {hasTrial && (
                            <Td label="Trial adds" align="right">
                              {percent(month.added)}
                            </Td>
                          )}
                          <Td label="Most uncovered">{month.uncovered}</Td>
                        </Tr>
                      ))}
                    </TBody>
                  </Table>
                </div>
              </div>
            ))}
          </div>
          <Section
            title="Try a stand"
            note="See what a seat with these winds would add before anybody hangs it. Nothing is saved."
          >
            <form method="get" action={page} className="mb-4 grid max-w-2xl gap-5 sm:grid-cols-2">
              <TextInput
                label="Its good winds"
                name="trial"
                defaultValue={ask.trial}
                hint="NW-N, 310-20, SW; SE"
                error={view.trial.problem ?? undefined}
              />
              <Select
                label="Hunted in"
                name="window"
                defaultValue={ask.window}
                options={[
                  { value: 'both', label: 'Mornings and evenings' },
                  { value: 'morning', label: 'Mornings' },
                  { value: 'evening', label: 'Evenings' },
                ]}
              />
              <TextInput label="Latitude" optional name="lat" inputMode="decimal" defaultValue={ask.lat ?? ''} />
              <TextInput label="Longitude" optional name="lon" inputMode="decimal" defaultValue={ask.lon ?? ''} />
              <div className="flex flex-wrap gap-3">
                <Button type="submit" look="primary">
                  Try it
                </Button>
                {hasTrial && <ButtonLink href={page}>Take it away</ButtonLink>}
              </div>
            </form>
            {hasTrial && (
              <div className="grid gap-3">
                <p className="font-semibold">The trial alone covers {gain} that no stand covers now.</p>
                {view.trial.placed && <p>{view.trial.placed}</p>}
                <TrialMap club={slug} at={at} />
              </div>
            )}
          </Section>
          <Section
            title="By stand"
            note="Hours with the wind in a good arc of the stand in a window it is hunted in. Alone: hours no other stand covers."
          >
            <Table caption="Hours covered by each stand" captionHidden>
              <THead>
                <Th>Stand</Th>
                <Th align="right">Mornings, h</Th>
                <Th align="right">Evenings, h</Th>
                <Th align="right">Of all wind</Th>
                <Th align="right">Alone, h</Th>
              </THead>
              <TBody>
                {view.stands.map((stand) => (
                  <Tr key={stand.id}>
                    <RowHead>{stand.trial ? 'The trial' : stand.name}</RowHead>
                    <Td label="Mornings, h" align="right">
                      {stand.morning}
                    </Td>
                    <Td label="Evenings, h" align="right">
                      {stand.evening}
                    </Td>
                    <Td label="Of all wind" align="right">
                      {percent(stand.share)}
                    </Td>
                    <Td label="Alone, h" align="right">
                      {stand.alone}
                    </Td>
                  </Tr>
                ))}
              </TBody>
            </Table>
          </Section>
        </>
      )}
    </>
  );
});
