'use client';

import { useRouter } from 'next/navigation';
import { type ComponentProps, useEffect, useRef } from 'react';
import { Notice } from '@/ui/notices';
import { ProgressBar } from '@/ui/progress-bar';
import { useRead } from '@/ui/query';
import { useToast } from '@/ui/toast';
import { runQuery } from '../queries';
import type { RunView } from '../read-run';
import { RUN_WORDS as WORDS } from '../words/screens';
import { DrawButton } from './draw-button';

interface RunPanelProps {
  club: string;
  drawId: string;
  initial: RunView | null;
  stop: ComponentProps<typeof DrawButton<{ drawId: string }>>['act'];
}

/** The sums at work: since when, how good the best answer so far is, and a way to stop them. */
export function RunPanel({ club, drawId, initial, stop }: RunPanelProps) {
  const router = useRouter();
  const toast = useToast();
  const { data: run } = useRead({ ...runQuery(club, drawId, initial?.id), initialData: initial });
  const watched = useRef<string | null>(null);
  useEffect(() => {
    if (run?.atWork) {
      watched.current = run.id;
      return;
    }
    if (!run || watched.current !== run.id) return;
    watched.current = null;
    if (run.message === null) toast({ title: WORDS.done });
    router.refresh();
  }, [run, router, toast]);
  if (!run) return null;
  if (!run.atWork) {
    return run.message === null ? null : (
      <Notice level="caution" title={WORDS.failed} live className="mb-4">
        {run.message}
      </Notice>
    );
  }
  return (
    <div className="mb-4 grid max-w-2xl gap-3">
      <ProgressBar label={WORDS.title} share={null} />
      <p role="status">
        {WORDS.since(run.sinceText)} {run.gapPercent === null ? WORDS.reading : WORDS.best(run.gapPercent)}
      </p>
      <div>
        <DrawButton
          club={club}
          values={{ drawId }}
          label={WORDS.stop}
          title={WORDS.stopTitle}
          done={WORDS.stopped}
          act={stop}
        >
          {WORDS.stopText}
        </DrawButton>
      </div>
    </div>
  );
}
