'use client';

import { formatDay } from '@/core/day-time';
import { Dialog } from '@/ui/dialog';
import { Loading, Notice } from '@/ui/notices';
import { useRead } from '@/ui/query';
import type { SitsAskText } from '../ask-schema';
import { compareRows } from '../compare-rows';
import { sitDetailQuery } from '../queries';
import type { SitDetailView, SitsView } from '../view-types';
import { WINDOW_WORDS } from '../words';

export interface CompareDialogProps {
  view: SitsView;
  ask: SitsAskText;
  standIds: [string, string];
  onClose: () => void;
}

/** Two stands of a window side by side. */
export function CompareDialog({ view, ask, standIds, onClose }: CompareDialogProps) {
  const { day, window } = view.window;
  const first = useRead(sitDetailQuery(view.club.slug, standIds[0], { ...ask, day, window }));
  const second = useRead(sitDetailQuery(view.club.slug, standIds[1], { ...ask, day, window }));
  const error = first.error ?? second.error;
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title="Side by side"
      description={`${formatDay(day)}, ${WINDOW_WORDS[window]}. The better figure of a line is set bold.`}
      className="sm:w-[min(48rem,calc(100vw-3rem))]"
    >
      {first.data && second.data ? (
        <CompareTable view={view} pair={[first.data, second.data]} />
      ) : error ? (
        <Notice level="caution" title="The two could not be read">
          {error.message}
        </Notice>
      ) : (
        <Loading label="Reading both stands" lines={6} />
      )}
    </Dialog>
  );
}

function gateOf(view: SitsView, standId: string): string | null {
  return view.blocked.find((row) => row.standId === standId)?.gates[0]?.text ?? null;
}

function CompareTable({ view, pair }: { view: SitsView; pair: [SitDetailView, SitDetailView] }) {
  const gates = pair.map(({ standId }) => gateOf(view, standId));
  return (
    <table className="w-full table-fixed border-collapse">
      <caption className="sr-only">{`${pair[0].name} and ${pair[1].name}`}</caption>
      <thead>
        <tr className="border-rule-strong border-b align-bottom">
          <td className="w-[26%] py-1.5" />
          {pair.map(({ standId, name }) => (
            <th key={standId} scope="col" className="py-1.5 pl-3 text-left font-serif text-lg leading-snug">
              {name}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {gates.some(Boolean) && (
          <tr className="border-rule border-b align-top">
            <RowHead label="Open" />
            {gates.map((gate, i) => (
              <td key={pair[i]?.standId} className="py-1.5 pl-3">
                {gate ?? 'Yes'}
              </td>
            ))}
          </tr>
        )}
        {compareRows(pair, view.club).map(({ label, texts, better }) => (
          <tr key={label} className="border-rule border-b align-top">
            <RowHead label={label} />
            {texts.map((lines, i) => (
              <td key={pair[i]?.standId} className={better === i ? 'py-1.5 pl-3 font-semibold' : 'py-1.5 pl-3'}>
                {lines.map((line) => (
                  <p key={line}>{line}</p>
                ))}
                {better === i && <span className="sr-only">the better of the two</span>}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function RowHead({ label }: { label: string }) {
  return (
    <th scope="row" className="py-1.5 text-left font-normal text-ink-soft text-sm">
      {label}
    </th>
  );
}
