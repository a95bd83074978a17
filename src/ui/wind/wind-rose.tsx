import { toRad } from '@/core/angles';
import { SECTORS } from '@/core/sectors';
import { describeRose, gatherSectors, ringStep } from './rose-shares';
import { round } from './strip-drawing';
import { BIN_COUNT, percent } from './strip-shares';

export interface WindRoseProps {
  /** 16 shares by compass point from N clockwise, or 72 of 5 degrees. With `calmShare` they sum to 1. */
  shares: readonly number[];
  calmShare?: number;
  label?: string;
  size?: number;
  className?: string;
}

const RADIUS = 80;
const HUB = 8;

function point(deg: number, r: number): string {
  return `${round(r * Math.sin(toRad(deg)))} ${round(-r * Math.cos(toRad(deg)))}`;
}

/** A standard 16-point wind rose: each petal lies where the wind comes from, its length the share of time. */
export function WindRose({ shares, calmShare = 0, label, size = 240, className }: WindRoseProps) {
  const sectors = shares.length === BIN_COUNT ? gatherSectors(shares) : shares;
  const fullest = Math.max(0, ...sectors);
  const step = ringStep(fullest);
  const top = Math.max(step, Math.ceil(fullest / step - 1e-9) * step);
  const rings = Array.from({ length: Math.round(top / step) }, (_, ring) => (ring + 1) * step);
  const radiusOf = (share: number) => HUB + (share / top) * (RADIUS - HUB);
  const text = label ?? describeRose(sectors, calmShare);
  return (
    <svg viewBox="-104 -104 208 208" width={size} height={size} role="img" aria-label={text} className={className}>
      <title>{text}</title>
      {rings.map((share) => (
        <circle
          key={share}
          r={round(radiusOf(share))}
          fill="none"
          stroke="var(--color-rule-strong)"
          strokeWidth={0.5}
        />
      ))}
      <path d="M0 -84V84M-84 0H84" stroke="var(--color-rule)" strokeWidth={0.75} />
      {SECTORS.map(({ name, centreDeg, index }) => {
        const share = sectors[index] ?? 0;
        if (share <= 0) return null;
        const r = round(radiusOf(share));
        const [from, to] = [centreDeg - 8.5, centreDeg + 8.5];
        const d = `M${point(from, HUB)}L${point(from, r)}A${r} ${r} 0 0 1 ${point(to, r)}L${point(to, HUB)}A${HUB} ${HUB} 0 0 0 ${point(from, HUB)}z`;
        return <path key={name} d={d} fill="var(--color-ink)" fillOpacity={0.82} data-sector={name} />;
      })}
      <circle r={HUB - 1} fill="var(--color-paper)" stroke="var(--color-ink)" strokeWidth={0.75} />
      {calmShare >= 0.005 && (
        <text y={2.6} fontSize={7} textAnchor="middle" fill="var(--color-ink)">
          {Math.round(calmShare * 100)}
        </text>
      )}
      {rings.map((share) => (
        <text
          key={share}
          x={round(radiusOf(share) * Math.sin(toRad(113))) + 1}
          y={round(-radiusOf(share) * Math.cos(toRad(113))) + 2.5}
          fontSize={8.5}
          fill="var(--color-ink)"
          stroke="var(--color-paper)"
          strokeWidth={2.5}
          paintOrder="stroke"
        >
          {percent(share)}
        </text>
      ))}
      {SECTORS.filter(({ index }) => index % 2 === 0).map(({ name, centreDeg }) => (
        <text
          key={name}
          x={round(94 * Math.sin(toRad(centreDeg)))}
          y={round(-94 * Math.cos(toRad(centreDeg))) + 4}
          fontSize={name.length === 1 ? 12 : 9.5}
          fontWeight={name.length === 1 ? 600 : 400}
          textAnchor="middle"
          fill="var(--color-ink)"
        >
          {name}
        </text>
      ))}
    </svg>
  );
}
