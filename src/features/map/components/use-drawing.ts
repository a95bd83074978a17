'use client';

import { useCallback, useEffect, useMemo, useState } from 'react';
import { z } from 'zod';
import { applyChanges } from '../drawing/apply-changes';
import { type Drawing, rebase, redo, startDrawing, undo } from '../drawing/drawing';
import { listChanges } from '../drawing/list-changes';
import { type DrawingChange, drawingChange } from '../drawing-schema';
import type { MapThing } from '../thing';

const kept = z.array(drawingChange);

function readKept(key: string): DrawingChange[] {
  try {
    const parsed = kept.safeParse(JSON.parse(sessionStorage.getItem(key) ?? '[]'));
    return parsed.success ? parsed.data : [];
  } catch {
    return [];
  }
}

function writeKept(key: string, changes: DrawingChange[]): void {
  try {
    if (changes.length === 0) sessionStorage.removeItem(key);
    else sessionStorage.setItem(key, JSON.stringify(changes));
  } catch {
    // A full or closed store loses the copy only: the drawing itself is still on the screen.
  }
}

/** A map being drawn. What is not saved is kept in the tab and brought back when the screen is opened again. */
export function useDrawing(club: string, stored: readonly MapThing[]) {
  const key = `map-drawing:${club}`;
  const [first] = useState(() => readKept(key));
  const [brought, setBrought] = useState(first.length > 0);
  const [drawing, setDrawing] = useState<Drawing>(() =>
    first.length > 0 ? rebase(stored, applyChanges(stored, first)) : startDrawing(stored),
  );
  const changes = useMemo(() => listChanges(drawing.base, drawing.things), [drawing.base, drawing.things]);
  const clean = changes.length === 0;

  useEffect(() => writeKept(key, changes), [key, changes]);
  useEffect(() => {
    setDrawing((now) => (clean && now.base !== stored ? startDrawing(stored) : now));
  }, [stored, clean]);

  return {
    drawing,
    things: drawing.things,
    changes,
    brought,
    change: useCallback((step: (drawing: Drawing) => Drawing) => setDrawing(step), []),
    undo: useCallback(() => setDrawing(undo), []),
    redo: useCallback(() => setDrawing(redo), []),
    /** Goes on from the map as it is stored now. */
    restart: useCallback((base: readonly MapThing[], things: readonly MapThing[] = base) => {
      setBrought(false);
      setDrawing(rebase(base, things));
    }, []),
  };
}

let count = 0;
/** An id for what is not saved yet; no other tab or earlier drawing has it. */
export function newThingId(): string {
  count += 1;
  return `new-${Date.now().toString(36)}-${count}`;
}
