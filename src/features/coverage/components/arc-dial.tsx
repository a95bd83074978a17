'use client';

import { type KeyboardEvent, type PointerEvent, useRef } from 'react';
import { normalizeDeg } from '@/core/angles';
import { arcWidthDeg } from '@/core/arcs';
import type { GoodWindArc } from '@/core/ground-types';
import { SECTOR_NAMES, sectorName } from '@/core/sectors';
import { bracketPath, dragDeg, onCircle } from '@/features/map/drawing/bracket';
import { DIAL_WORDS as W } from '../words';

const RING = 104;
const PETAL = 84;
const HUB = 6;

export interface ArcDialProps {
  arcs: readonly GoodWindArc[];
  /** Shares of the winds nobody covers, by compass point, 16 from N clockwise. */
  open: readonly number[];
  onTurn: (arcs: GoodWindArc[]) => void;
}

const ENDS = ['fromDeg', 'toDeg'] as const;
type End = (typeof ENDS)[number];

const STEPS: Record<string, number> = {
  ArrowRight: 5,
  ArrowUp: 5,
  ArrowLeft: -5,
  ArrowDown: -5,
  PageUp: 22.5,
  PageDown: -22.5,
};

function petal(index: number, length: number): string {
  const [from, to] = [index * 22.5 - 9, index * 22.5 + 9];
  const spot = (deg: number, r: number) =>
    onCircle(deg, r)
      .map((v) => v.toFixed(1))
      .join(' ');
  return `M${spot(from, HUB)}L${spot(from, length)}A${length} ${length} 0 0 1 ${spot(to, length)}L${spot(to, HUB)}Z`;
}

/** Good winds on a compass: each arc has two handles that are dragged by hand or turned by keys, round the winds nobody covers. */
export function ArcDial({ arcs, open, onTurn }: ArcDialProps) {
  const svg = useRef<SVGSVGElement>(null);
  const most = Math.max(0.001, ...open);
  function set(arc: number, end: End, deg: number) {
    onTurn(
      arcs.map((one, i) =>
        i === arc ? { ...one, fromDeg: normalizeDeg(one.fromDeg), toDeg: normalizeDeg(one.toDeg), [end]: deg } : one,
      ),
    );
  }
  function drag(event: PointerEvent, arc: number, end: End) {
    const box = svg.current?.getBoundingClientRect();
    if (!box || !event.currentTarget.hasPointerCapture(event.pointerId)) return;
    set(arc, end, dragDeg(event.clientX - box.x - box.width / 2, event.clientY - box.y - box.height / 2));
  }
  function turn(event: KeyboardEvent, arc: number, end: End, deg: number) {
    const step = STEPS[event.key];
    if (step === undefined) return;
    event.preventDefault();
    set(arc, end, normalizeDeg(deg + (event.shiftKey ? Math.sign(step) : step)));
  }
  const handles = arcs.flatMap((one, arc) =>
    arcWidthDeg(one) >= 360
      ? []
      : ENDS.map((end) => ({ id: `${arc} ${end}`, arc, end, deg: Math.round(normalizeDeg(one[end])) % 360 })),
  );
  return (
    <svg ref={svg} viewBox="-140 -140 280 280" width={280} height={280} className="max-w-full">
      <title>{W.label}</title>
      <circle r={RING} fill="none" stroke="var(--color-rule-strong)" />
      {open.map((share, i) =>
        share > 0 ? (
          <path
            key={SECTOR_NAMES[i]}
            d={petal(i, HUB + (share / most) * (PETAL - HUB))}
            fill="none"
            stroke="var(--color-ink)"
            strokeWidth={1}
          />
        ) : null,
      )}
      {(['N', 'E', 'S', 'W'] as const).map((name, i) => {
        const [x, y] = onCircle(i * 90, RING + 25);
        return (
          <text key={name} x={x} y={y} dy={5} textAnchor="middle" fontSize={15} fill="var(--color-ink-soft)">
            {name}
          </text>
        );
      })}
      {arcs.map((arc, i) => (
        <path
          // biome-ignore lint/suspicious/noArrayIndexKey: arcs are told apart by their place in the list alone
          key={i}
          d={bracketPath(arc, RING, 10)}
          fill="none"
          stroke="var(--color-moss)"
          strokeWidth={6}
        />
      ))}
      {handles.map(({ id, arc, end, deg }) => {
        const [x, y] = onCircle(deg, RING);
        return (
          <g
            key={id}
            role="slider"
            tabIndex={0}
            aria-label={end === 'fromDeg' ? W.from(arc + 1) : W.to(arc + 1)}
            aria-valuemin={0}
            aria-valuemax={359}
            aria-valuenow={deg}
            aria-valuetext={W.value(sectorName(deg), deg)}
            transform={`translate(${x} ${y})`}
            className="cursor-grab touch-none focus-visible:outline-none [&:focus-visible>circle]:stroke-[5]"
            onPointerDown={(event) => event.currentTarget.setPointerCapture(event.pointerId)}
            onPointerMove={(event) => drag(event, arc, end)}
            onKeyDown={(event) => turn(event, arc, end, deg)}
          >
            <circle r={22} fill="transparent" className="stroke-none!" />
            <circle r={11} fill="var(--color-panel)" stroke="var(--color-clay)" strokeWidth={3} />
          </g>
        );
      })}
    </svg>
  );
}
