import { Button } from '@/ui/button';
import { RangeChart } from '@/ui/charts/range-chart';
import { EmptyState, ErrorState, Loading, Notice } from '@/ui/notices';
import { Badge, Card, DefinitionList, Section } from '@/ui/page-parts';
import * as pageSigns from '@/ui/page-signs';
import { Pager } from '@/ui/pager';
import { ProgressBar } from '@/ui/progress-bar';
import * as signs from '@/ui/signs';
import { TabLinks } from '@/ui/tab-links';
import { Wordmark } from '@/ui/wordmark';
import { ShowOverlays, ShowTable } from './show-client-parts';

const { drawn: _, ...ownSigns } = signs;
const SIGNS = { ...ownSigns, ...pageSigns };

const CHART = [
  { key: 'n', label: 'North', range: { value: 1.2, low: 0.6, high: 2.1 }, text: '1.2 in 31 h' },
  { key: 's', label: 'South', range: { value: 0.4, low: 0.1, high: 1.3 }, text: '0.4 in 12 h' },
];

export function ShowParts() {
  return (
    <>
      <Section title="Notices">
        <div className="grid gap-3">
          <Notice>The forecast is three hours old.</Notice>
          <Notice level="caution">Gusts to 34 mph at the seat. Think twice about a raised stand.</Notice>
          <Notice level="stop" title="Stay down">
            Sustained 32 mph. Use a blind on the ground.
          </Notice>
        </div>
      </Section>
      <Section title="Words and facts">
        <p className="flex flex-wrap gap-2">
          <Badge look="moss">Quiet</Badge>
          <Badge>Touchy</Badge>
          <Badge look="clay">Loud</Badge>
          <Badge look="strong">Yours</Badge>
        </p>
        <div className="mt-4 grid gap-6 sm:grid-cols-2">
          <DefinitionList
            items={[
              { term: 'Sunrise', detail: '6:45' },
              { term: 'First legal light', detail: '6:15, by the club’s rule' },
              { term: 'Rest', detail: '3 full days after a sit' },
            ]}
          />
          <Card>
            <p className="font-serif text-lg">Creek Gate</p>
            <p className="text-ink-soft">Eleven minutes on foot, bearing 214° true.</p>
          </Card>
        </div>
      </Section>
      <Section title="Tabs, menus, dialogs, messages">
        <TabLinks
          label="Window"
          items={[
            { href: '/dev/ui', label: 'Saturday morning', current: true },
            { href: '/dev/ui?e', label: 'Saturday evening' },
            { href: '/dev/ui?m', label: 'Sunday morning' },
          ]}
        />
        <ShowOverlays />
      </Section>
      <Section title="Signs">
        <div className="flex flex-wrap items-center gap-3">
          <Wordmark className="text-2xl" />
          {Object.entries(SIGNS).map(([name, Sign]) => (
            <Sign key={name} />
          ))}
        </div>
      </Section>
      <Section title="Pages of a list, work under way, a chart">
        <div className="grid gap-4">
          <Pager page={2} pages={3} hrefFor={(page) => `/dev/ui?page=${page}`} />
          <ProgressBar label="Reading the file" share={0.4} />
          <RangeChart title="Deer seen an hour, by wind." unit="deer an hour" rows={CHART} />
        </div>
      </Section>
      <Section title="A table">
        <ShowTable />
      </Section>
      <Section title="Nothing yet, waiting, broken">
        <div className="grid gap-4">
          <EmptyState title="No stands yet" action={<Button look="primary">Add the first stand</Button>}>
            Add one and give it its good winds; the list needs nothing more to begin.
          </EmptyState>
          <Loading lines={3} />
          <ErrorState reference="7f3a" action={<Button>Try again</Button>}>
            The forecast did not come. Stands are ranked by way in and rest until it does.
          </ErrorState>
        </div>
      </Section>
    </>
  );
}
