import type { GateStand } from '../gate-sheet/read-gate-sheet';
import type { Sketch } from '../gate-sheet/sketch-ground';
import { GATE_SHEET_WORDS } from '../words/gate-sheet';

const LINES = {
  boundary: { strokeWidth: 2, strokeDasharray: '10 4 2 4' },
  road: { strokeWidth: 3, strokeDasharray: undefined },
  way: { strokeWidth: 0.9, strokeDasharray: '4 3' },
} as const;

const R = 9;
/** Follows the light on a screen, and is white on paper. */
const PAPER = 'var(--color-paper)';

function StandMark({ x, y, stand }: { x: number; y: number; stand: GateStand }) {
  const booked = stand.state === 'booked';
  return (
    <g transform={`translate(${x} ${y})`}>
      <circle r={R} fill={booked ? 'currentColor' : PAPER} stroke="currentColor" strokeWidth={1.4} />
      <text y={3.6} fontSize={10.5} fontWeight={700} textAnchor="middle" fill={booked ? PAPER : 'currentColor'}>
        {stand.number}
      </text>
      {stand.state === 'closed' && <path d="M-9-9L9 9M-9 9L9-9" stroke="currentColor" strokeWidth={1.6} />}
    </g>
  );
}

/** The ground in one ink: numbered stands, parking, ways and the boundary; no picture lies under it. */
export function SketchMap({ sketch, stands }: { sketch: Sketch; stands: GateStand[] }) {
  const { width, height, scale } = sketch;
  const byId = new Map(stands.map((stand) => [stand.id, stand]));
  return (
    <svg
      viewBox={`0 0 ${width} ${height + 26}`}
      role="img"
      aria-label={GATE_SHEET_WORDS.sketch}
      className="h-auto w-full border border-ink bg-paper text-ink"
    >
      <title>{GATE_SHEET_WORDS.sketch}</title>
      {sketch.lines.map(({ kind, path }) => (
        <path key={path} d={path} fill="none" stroke="currentColor" strokeLinejoin="round" {...LINES[kind]} />
      ))}
      {sketch.parkings.map(({ name, x, y, side }) => (
        <g key={name} transform={`translate(${x} ${y})`}>
          <rect x={-7} y={-7} width={14} height={14} fill={PAPER} stroke="currentColor" strokeWidth={1.4} />
          <text y={4} fontSize={11} fontWeight={700} textAnchor="middle" fill="currentColor">
            {GATE_SHEET_WORDS.parkingSign}
          </text>
          <text
            x={side === 'right' ? 11 : -11}
            y={4}
            fontSize={11}
            fill="currentColor"
            textAnchor={side === 'right' ? 'start' : 'end'}
            stroke={PAPER}
            strokeWidth={3}
            paintOrder="stroke"
          >
            {name}
          </text>
        </g>
      ))}
      {sketch.stands.map(({ id, x, y }) => {
        const stand = byId.get(id);
        return stand && <StandMark key={id} x={x} y={y} stand={stand} />;
      })}
      <g transform={`translate(22 ${height + 6})`}>
        <path d="M0 8V-12M-4-6L0-13L4-6" stroke="currentColor" strokeWidth={1.5} fill="none" />
        <text x={7} y={0} fontSize={11} fontWeight={700} fill="currentColor">
          {GATE_SHEET_WORDS.north}
        </text>
      </g>
      {scale && (
        <g transform={`translate(${width - scale.length - 20} ${height + 10})`}>
          <path d={`M0-5V0H${scale.length}V-5`} stroke="currentColor" strokeWidth={1.4} fill="none" />
          <text x={scale.length / 2} y={-5} fontSize={11} textAnchor="middle" fill="currentColor">
            {scale.label}
          </text>
        </g>
      )}
    </svg>
  );
}
