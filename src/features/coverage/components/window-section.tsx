import { FigureHead, FigureTable } from '@/ui/figure-table';
import { Section } from '@/ui/page-parts';
import { TBody, Td, THead, Th, Tr } from '@/ui/table';
import { WindRose } from '@/ui/wind/wind-rose';
import type { WindowCoverage } from '../reads';
import { shareText } from '../share-text';
import { MONTH_NAMES, COVERAGE_WORDS as W, WINDOW_TITLES } from '../words';
import { PointBars } from './point-bars';

/** The winds of one window over a season: by compass point and by month, and how much of each is covered. */
export function WindowSection({ coverage }: { coverage: WindowCoverage }) {
  const { window, hours, covered, calmShare, points, months } = coverage;
  return (
    <div>
      <Section title={WINDOW_TITLES[window]} note={W.windowNote(hours, shareText(covered), shareText(calmShare))}>
        <div className="mb-4 flex justify-center">
          <WindRose shares={points.map((p) => p.share * (1 - calmShare))} calmShare={calmShare} size={220} />
        </div>
        <PointBars points={points} label={W.byPoint(window)} />
      </Section>
      <details className="mt-4">
        <summary className="cursor-pointer py-2.5 font-semibold">{W.openMonths}</summary>
        <FigureTable caption={W.byMonth(window)}>
          <THead>
            <Th>{W.month}</Th>
            <Th align="right">{W.hours}</Th>
            <Th align="right">{W.covered}</Th>
            <Th>{W.uncovered}</Th>
          </THead>
          <TBody>
            {months.map((month) => (
              <Tr key={month.month}>
                <FigureHead>{MONTH_NAMES[month.month - 1]}</FigureHead>
                <Td align="right">{month.hours}</Td>
                <Td align="right">{shareText(month.covered)}</Td>
                <Td>{month.uncovered}</Td>
              </Tr>
            ))}
          </TBody>
        </FigureTable>
      </details>
    </div>
  );
}
