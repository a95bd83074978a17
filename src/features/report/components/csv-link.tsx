import { ButtonLink } from '@/ui/button';
import { reportAddress } from '../report-address';
import type { ReportPart } from '../report-schema';
import { REPORT_PAGE_WORDS as words } from '../words/page';
import type { PartProps } from './part-props';

interface CsvLinkProps extends PartProps {
  part: ReportPart;
  /** What is in the file. */
  title: string;
  /** Where two stand together each says what it is of. */
  named?: boolean;
}

/** Takes one part out as a file. On paper there is nothing to press. */
export function CsvLink({ club, report, part, title, named = false }: CsvLinkProps) {
  return (
    <span className="print:hidden">
      <ButtonLink
        href={reportAddress(`/api/clubs/${club}/report`, report.period, { part })}
        aria-label={words.csvOf(title)}
      >
        {named ? words.csvOf(title) : words.csv}
      </ButtonLink>
    </span>
  );
}
