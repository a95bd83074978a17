import type { TrialGain } from '@/core/coverage/try-stand';
import { SECTOR_NAMES } from '@/core/sectors';
import { FigureHead, FigureTable } from '@/ui/figure-table';
import { Section } from '@/ui/page-parts';
import { TBody, Td, THead, Th, Tr } from '@/ui/table';
import { shareText } from '../share-text';
import { COVERAGE_WORDS, MONTH_NAMES, TRIAL_WORDS as W, WINDOW_TITLES } from '../words';
import { PointBars } from './point-bars';

/** What a trial adds, in a sentence. */
export function gainText(gains: readonly TrialGain[]): string {
  const parts = gains
    .filter(({ alone }) => alone > 0)
    .map(({ window, added, alone }) => W.gainPart(shareText(added), window, alone));
  return `${W.gain(parts)} ${W.hours(gains.reduce((sum, { hours }) => sum + hours, 0))}`;
}

/** The same by compass point and by month. */
export function TrialResults({ gains }: { gains: readonly TrialGain[] }) {
  const months = [...new Set(gains.flatMap((gain) => gain.months.map(({ month }) => month)))];
  const addedIn = (gain: TrialGain, month: number) => gain.months.find((one) => one.month === month)?.added ?? null;
  return (
    <>
      <div className="grid gap-x-10 gap-y-6 lg:grid-cols-2">
        {gains.map((gain) => (
          <Section key={gain.window} level={3} title={W.withTrial(gain.window)} className="mt-0">
            <PointBars
              trial
              points={gain.points
                .map((point, i) => ({ name: SECTOR_NAMES[i] ?? '', ...point }))
                .filter((_, i) => gain.winds.has(i))}
              label={COVERAGE_WORDS.byPoint(gain.window)}
            />
          </Section>
        ))}
      </div>
      <FigureTable caption={W.addsByMonth}>
        <THead>
          <Th>{W.month}</Th>
          {gains.map(({ window }) => (
            <Th key={window} align="right">
              {WINDOW_TITLES[window]}
            </Th>
          ))}
        </THead>
        <TBody>
          {months.map((month) => (
            <Tr key={month}>
              <FigureHead>{MONTH_NAMES[month - 1]}</FigureHead>
              {gains.map((gain) => (
                <Td key={gain.window} align="right">
                  {shareText(addedIn(gain, month))}
                </Td>
              ))}
            </Tr>
          ))}
        </TBody>
      </FigureTable>
    </>
  );
}
