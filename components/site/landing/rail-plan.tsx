import { BOARD, GROOVE, KERF, LEAVES, RAIL, STEM, TAB, TABS, type Point } from './rail-model';

/** The rail seen from above, in mm with y up (the caller turns it): one face in ink, the other as hidden lines. */
export function RailPlan({ face }: { face: 'A' | 'B' }) {
  return (
    <g strokeLinejoin="round">
      <rect width={BOARD.x} height={BOARD.y} className="fill-wood-0" />
      <Grain />
      <path d={ring(RAIL)} strokeWidth={2 * KERF} className="fill-none stroke-wood-1 opacity-70" />
      <path d={ring(RAIL)} className="fill-wood-0 stroke-wood-2" strokeWidth="1.2" />
      <path d={ring(RAIL)} strokeWidth="4.4" className="fill-none stroke-wood-1 opacity-35" />
      {face === 'A' ? <LeafMotif /> : <Groove />}
      {face === 'A' ? <HiddenGroove /> : <HiddenLeaves />}
      {TABS.map(({ at, angle }) => (
        <rect
          key={at.join()}
          x={-TAB.length / 2}
          y={-KERF / 2 - 1.5}
          width={TAB.length}
          height={KERF + 3}
          rx="0.8"
          transform={`translate(${at.join(' ')}) rotate(${angle})`}
          className="fill-tab stroke-wood-2"
          strokeWidth="0.7"
        />
      ))}
      <rect width={BOARD.x} height={BOARD.y} className="fill-none stroke-ink" strokeWidth="1.2" />
    </g>
  );
}

function LeafMotif() {
  return (
    <g>
      <path d={line(STEM)} className="fill-none stroke-wood-2" strokeWidth="1.4" />
      {LEAVES.map((leaf) => (
        <g key={leaf[0]?.join()} className="stroke-wood-2">
          <path d={ring(leaf)} className="fill-wood-1" strokeWidth="0.8" />
          <path d={line([leaf[0] ?? [0, 0], leaf[12] ?? [0, 0]])} strokeWidth="0.7" />
        </g>
      ))}
    </g>
  );
}

function Groove() {
  return (
    <rect
      y={GROOVE.from}
      width={BOARD.x}
      height={GROOVE.to - GROOVE.from}
      className="fill-wood-1 stroke-wood-2"
      strokeWidth="0.9"
    />
  );
}

function HiddenGroove() {
  return (
    <path
      d={`M0 ${GROOVE.from}H${BOARD.x}M0 ${GROOVE.to}H${BOARD.x}`}
      className="fill-none stroke-face-b-fill"
      strokeWidth="0.9"
      strokeDasharray="6 3.5"
    />
  );
}

function HiddenLeaves() {
  return (
    <g className="fill-none stroke-face-a-fill" strokeWidth="0.9" strokeDasharray="5 3">
      {LEAVES.map((leaf) => (
        <path key={leaf[0]?.join()} d={ring(leaf)} />
      ))}
    </g>
  );
}

/** Long, slightly waved lines along x; the same on every visit. */
function Grain() {
  const rows = [9, 22, 33, 47, 58, 63, 92, 101, 118, 126, 133];
  return (
    <g className="fill-none stroke-wood-1 opacity-30" strokeWidth="0.6">
      {rows.map((y, i) => (
        <path
          key={y}
          d={`M0 ${y}c${80 + 7 * i} ${3 - (i % 3)} ${150 + 9 * i} ${-4 + (i % 4)} 480 ${(i % 5) - 2}`}
        />
      ))}
    </g>
  );
}

function line(points: readonly Point[]): string {
  return `M${points.map(([x, y]) => `${round(x)} ${round(y)}`).join('L')}`;
}

function ring(points: readonly Point[]): string {
  return `${line(points)}Z`;
}

/** Server and browser must write the same digits. */
function round(value: number): number {
  return Math.round(value * 100) / 100;
}
