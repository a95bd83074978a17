import { sectorName } from '@/core/sectors';
import { mpsToKt } from '@/core/units';
import { BARB_WORDS } from '../words/wind';
import { barbMarks, barbParts, STAFF } from './barb-parts';

export interface WindBarbProps {
  /** Where the wind comes from, degrees true; null: variable. */
  fromDeg: number | null;
  speedMps: number;
  /** Said in place of 'NW wind, 15 kt', as in the member's own units. */
  label?: string;
  size?: number;
  className?: string;
}

export function describeBarb(fromDeg: number | null, speedMps: number): string {
  const parts = barbParts(mpsToKt(speedMps));
  if (parts.calm) return BARB_WORDS.calm;
  return BARB_WORDS.wind(fromDeg === null ? BARB_WORDS.variable : sectorName(fromDeg), parts.knots);
}

/** A standard wind barb: the staff points to where the wind comes from. */
export function WindBarb({ fromDeg, speedMps, label, size = 40, className }: WindBarbProps) {
  const parts = barbParts(mpsToKt(speedMps));
  const marks = barbMarks(parts);
  const text = label ?? describeBarb(fromDeg, speedMps);
  return (
    <svg viewBox="-14 -14 28 28" width={size} height={size} role="img" aria-label={text} className={className}>
      <title>{text}</title>
      {parts.calm && (
        <>
          <circle r={3} fill="none" stroke="currentColor" strokeWidth={1.2} />
          <circle r={6.5} fill="none" stroke="currentColor" strokeWidth={1.2} />
        </>
      )}
      {!parts.calm && fromDeg === null && (
        <>
          <circle r={9} fill="none" stroke="currentColor" strokeWidth={1.5} strokeDasharray="3 3" />
          <text y={4} fontSize={12} textAnchor="middle" fill="currentColor">
            {parts.knots}
          </text>
        </>
      )}
      {!parts.calm && fromDeg !== null && (
        <g transform={`rotate(${Math.round(fromDeg)}) translate(0 ${STAFF / 2})`}>
          <circle r={2} fill="currentColor" />
          <path d={marks.lines} stroke="currentColor" strokeWidth={1.4} strokeLinecap="round" fill="none" />
          <path d={marks.fills} fill="currentColor" stroke="currentColor" strokeWidth={0.5} strokeLinejoin="round" />
        </g>
      )}
    </svg>
  );
}
