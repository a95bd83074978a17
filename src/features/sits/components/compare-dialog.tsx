'use client';

import { formatDay } from '@/core/day-time';
import { Dialog } from '@/ui/dialog';
import { Loading, Notice } from '@/ui/notices';
import { useRead } from '@/ui/query';
import type { SitsAskText } from '../ask-schema';
import { compareRows } from '../compare-rows';
import { sitDetailQuery } from '../queries';
import type { SitDetailView, SitsBrief } from '../view-types';
import { COMPARE_WORDS as WORDS } from '../words/detail';
import { windowTitle } from '../words/list';

export interface CompareDialogProps {
  view: SitsBrief;
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
      title={WORDS.title}
      description={WORDS.about(windowTitle(formatDay(day), window))}
      className="wide-sheet"
    >
      {first.data && second.data ? (
        <CompareTable view={view} pair={[first.data, second.data]} />
      ) : error ? (
        <Notice level="caution" title={WORDS.failed}>
          {error.message}
        </Notice>
      ) : (
        <Loading label={WORDS.reading} lines={6} />
      )}
    </Dialog>
  );
}

function gateOf(view: SitsBrief, standId: string): string | null {
  return view.blocked.find((row) => row.standId === standId)?.gate ?? null;
}

function CompareTable({ view, pair }: { view: SitsBrief; pair: [SitDetailView, SitDetailView] }) {
  const gates = pair.map(({ standId }) => gateOf(view, standId));
  return (
    <table className="w-full table-fixed border-collapse">
      <caption className="sr-only">{WORDS.both(pair[0].name, pair[1].name)}</caption>
      <thead>
        <tr className="border-rule-strong border-b align-bottom">
          <td className="w-1/4 py-1.5" />
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
            <RowHead label={WORDS.open} />
            {gates.map((gate, i) => (
              <td key={pair[i]?.standId} className="py-1.5 pl-3">
                {gate ?? WORDS.yes}
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
                {better === i && <span className="sr-only">{WORDS.better}</span>}
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
