'use client';

import type { ReactNode } from 'react';
import type { DrawnGeometry } from '@/features/ground/geometry-text';
import { Button } from '@/ui/button';
import { sizeText } from '../drawing/measure';
import type { MapClub } from '../thing';
import { DRAW_WORDS } from '../words/editing';

interface DrawBarProps {
  club: MapClub;
  /** What to do, in words. */
  title: ReactNode;
  /** As drawn so far. */
  shape: DrawnGeometry | null;
  children: ReactNode;
}

function countOf(shape: DrawnGeometry | null): number {
  if (shape?.type === 'LineString') return shape.coordinates.length;
  return shape?.type === 'Polygon' ? (shape.coordinates[0]?.length ?? 1) - 1 : 0;
}

/** Stands over the map while something is being drawn: how long and how large it is by now, and how to end. */
export function DrawBar({ club, title, shape, children }: DrawBarProps) {
  const count = countOf(shape);
  const size = shape && count > 1 ? sizeText(club, shape, club.units) : '';
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-2 border-clay border-l-4 bg-panel px-3 py-2">
      <p className="min-w-40 flex-1">
        <span className="font-semibold">{title}</span>
        {size && (
          <output className="block text-sm" data-size>
            {size}
          </output>
        )}
      </p>
      <div className="flex flex-wrap gap-2">{children}</div>
    </div>
  );
}

interface DrawingBarProps {
  club: MapClub;
  title: string;
  shape: DrawnGeometry | null;
  line: boolean;
  onFinish: () => void;
  onUndoPoint: () => void;
  onCancel: () => void;
}

export function DrawingBar({ club, title, shape, line, onFinish, onUndoPoint, onCancel }: DrawingBarProps) {
  return (
    <DrawBar club={club} title={title} shape={shape}>
      {line && (
        <>
          <Button look="primary" onClick={onFinish}>
            {DRAW_WORDS.finish}
          </Button>
          <Button onClick={onUndoPoint}>{DRAW_WORDS.undoPoint}</Button>
        </>
      )}
      <Button look="quiet" onClick={onCancel}>
        {DRAW_WORDS.cancel}
      </Button>
    </DrawBar>
  );
}
