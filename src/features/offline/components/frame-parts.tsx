'use client';

import { KeepPages, type PageToKeep } from '@/ui/offline/keep-pages';
import { ZoneNote } from '@/ui/zone-note';
import { WaitingPanel, type WaitingPanelProps } from './waiting-panel';

export interface FramePartsProps extends WaitingPanelProps {
  /** Pages to keep on this device; null: none are. */
  pages: PageToKeep[] | null;
}

/** The note of a zone that is not the reader's own, what waits to be sent, and the keeping of pages. */
export function FrameParts({ pages, ...waiting }: FramePartsProps) {
  return (
    <>
      <ZoneNote zone={waiting.zone} />
      <WaitingPanel {...waiting} />
      {pages && <KeepPages pages={pages} />}
    </>
  );
}
