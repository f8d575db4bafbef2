'use client';

import { useMemo, useRef, useState, type KeyboardEvent, type PointerEvent } from 'react';
import { Choice } from '@/components/ui/choice';
import { BOARD } from './rail-model';
import { RailPlan } from './rail-plan';
import { railSection, type SectionPiece } from './rail-section';

const MARGIN = 34;
const PLAN_TOP = 34;
const SECTION_TOP = PLAN_TOP + BOARD.y + 52;
const HEIGHT_FACTOR = 3;
const SECTION_HEIGHT = BOARD.z * HEIGHT_FACTOR;
const VIEW = { width: BOARD.x + 2 * MARGIN, height: SECTION_TOP + SECTION_HEIGHT + 16 };
/** User units: about 14 px on a phone, a tablet, a desk. */
const LETTERS = 'text-[22px] sm:text-[13px] lg:text-[12px]';

/** Plan and section of a rail that is cut from both faces. The section line can be dragged and moved by the arrow keys. */
export function RailDrawing() {
  const [face, setFace] = useState<'A' | 'B'>('A');
  const [at, setAt] = useState(77);
  const pieces = useMemo(() => railSection(at), [at]);
  const lineY = PLAN_TOP + (face === 'A' ? BOARD.y - at : at);
  const least = Math.min(...pieces.map((piece) => piece.least));
  return (
    <figure className="grid gap-3">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <Choice
          label="Face shown"
          value={face}
          onChange={setFace}
          options={[
            { value: 'A', label: 'Face A' },
            { value: 'B', label: 'Face B' },
          ]}
        />
        <p className="text-sm text-graphite">Drag the line A–A across the board.</p>
      </div>
      <svg
        viewBox={`0 0 ${VIEW.width} ${VIEW.height}`}
        className="w-full touch-pan-y select-none"
        role="group"
        aria-label="Plan and section of a wall rail"
      >
        <defs>
          <pattern
            id="rail-hatch"
            width="5"
            height="5"
            patternUnits="userSpaceOnUse"
            patternTransform="rotate(-45)"
          >
            <path d="M0 0H5" className="stroke-wood-1" strokeWidth="1.1" />
          </pattern>
        </defs>
        <LengthDimension />
        <g transform={`translate(${MARGIN} ${PLAN_TOP})`}>
          <g
            className="transition-transform duration-300 ease-in-out"
            style={{
              transform: face === 'A' ? `translateY(${BOARD.y}px) scaleY(-1)` : 'translateY(0) scaleY(1)',
            }}
          >
            <RailPlan face={face} />
          </g>
        </g>
        <SectionDrawing pieces={pieces} face={face} />
        <SectionLine y={lineY} at={at} face={face} onMove={setAt} />
      </svg>
      <figcaption className="sr-only">
        A rail from a board of 480 by 140 by 19 millimetres. Face A: leaves, a chamfer and the cut-out with
        four tabs. Face B: a groove and a chamfer.
      </figcaption>
      <p className="figure text-sm sm:text-base" aria-live="polite">
        A–A at {at.toFixed(0)} mm · least wood {least.toFixed(1)} mm
      </p>
    </figure>
  );
}

interface SectionLineProps {
  readonly y: number;
  readonly at: number;
  readonly face: 'A' | 'B';
  readonly onMove: (at: number) => void;
}

function SectionLine({ y, at, face, onMove }: SectionLineProps) {
  const handle = useRef<SVGGElement>(null);

  function drag(event: PointerEvent<SVGGElement>) {
    const svg = handle.current?.ownerSVGElement;
    if (!svg || !event.currentTarget.hasPointerCapture(event.pointerId)) return;
    const box = svg.getBoundingClientRect();
    const inView = ((event.clientY - box.top) / box.height) * VIEW.height - PLAN_TOP;
    onMove(onBoard(face === 'A' ? BOARD.y - inView : inView));
  }

  function step(event: KeyboardEvent) {
    const up = face === 'A' ? 1 : -1;
    const steps: Readonly<Record<string, number>> = {
      ArrowUp: up,
      ArrowDown: -up,
      PageUp: 10 * up,
      PageDown: -10 * up,
    };
    const by = steps[event.key];
    if (by === undefined) return;
    event.preventDefault();
    onMove(onBoard(at + by));
  }

  const [left, right] = [4, VIEW.width - 4];
  return (
    <g
      ref={handle}
      role="slider"
      tabIndex={0}
      aria-label="Section line A–A"
      aria-orientation="vertical"
      aria-valuemin={0}
      aria-valuemax={BOARD.y}
      aria-valuenow={at}
      aria-valuetext={`${at} millimetres from the front edge`}
      className="cursor-ns-resize touch-none stroke-ink"
      onPointerDown={(event) => event.currentTarget.setPointerCapture(event.pointerId)}
      onPointerMove={drag}
      onKeyDown={step}
    >
      <path d={`M${left} ${y}H${right}`} stroke="transparent" strokeWidth="24" />
      {/* On the wood the line stays dark, by night too. */}
      <path
        d={`M${MARGIN} ${y}h${BOARD.x}`}
        className="stroke-wood-2"
        strokeWidth="0.9"
        strokeDasharray="16 3 2.5 3"
      />
      {[left, right].map((x) => {
        const inward = x === left ? 20 : -20;
        return (
          <g key={x}>
            <path d={`M${x + inward} ${y}H${x + inward / 3}V${y - 16}`} fill="none" strokeWidth="2.2" />
            <path d={`M${x + inward / 3} ${y - 22}l-3.5 8h7z`} className="fill-ink" strokeWidth="0.5" />
            <text
              x={x + inward / 3}
              y={y + 16}
              textAnchor="middle"
              stroke="none"
              className={`lettering fill-ink ${LETTERS}`}
            >
              A
            </text>
          </g>
        );
      })}
    </g>
  );
}

function SectionDrawing({ pieces, face }: { pieces: readonly SectionPiece[]; face: 'A' | 'B' }) {
  const far = face === 'A' ? 'B' : 'A';
  const height = (h: number) => (face === 'A' ? BOARD.z - h : h) * HEIGHT_FACTOR;
  const path = (piece: SectionPiece) =>
    `M${piece.points.map(([x, h]) => `${x} ${height(h).toFixed(2)}`).join('L')}Z`;
  return (
    <g transform={`translate(${MARGIN} ${SECTION_TOP})`}>
      <text y={-10} className={`lettering fill-ink font-semibold ${LETTERS}`}>
        Section A–A
      </text>
      <text x={BOARD.x} y={-10} textAnchor="end" className={`${LETTERS} fill-graphite`}>
        height × 3
      </text>
      <text x={-20} y={12} className={`lettering font-semibold ${LETTERS} ${faceFill(face)}`}>
        {face}
      </text>
      <text x={-20} y={SECTION_HEIGHT} className={`lettering font-semibold ${LETTERS} ${faceFill(far)}`}>
        {far}
      </text>
      {/* The board's own edges, seen beyond the cut. */}
      <rect width={BOARD.x} height={SECTION_HEIGHT} className="fill-well stroke-graphite" strokeWidth="0.7" />
      {pieces.map((piece) => (
        <g key={piece.points[0]?.[0]} strokeLinejoin="round">
          <path d={path(piece)} className={piece.isTab ? 'fill-tab' : 'fill-wood-0'} />
          {piece.isTab ? null : <path d={path(piece)} fill="url(#rail-hatch)" />}
          <path d={path(piece)} className="fill-none stroke-ink" strokeWidth="1.4" />
        </g>
      ))}
    </g>
  );
}

function LengthDimension() {
  const y = 18;
  const [from, to, middle] = [MARGIN, MARGIN + BOARD.x, VIEW.width / 2];
  return (
    <g className="stroke-graphite" strokeWidth="0.9">
      <path d={`M${from} ${y - 8}V${PLAN_TOP - 3}M${to} ${y - 8}V${PLAN_TOP - 3}`} />
      <path d={`M${from} ${y}H${middle - 46}M${middle + 46} ${y}H${to}`} />
      <path d={`M${from} ${y}l9-2v4zM${to} ${y}l-9-2v4z`} className="fill-graphite" stroke="none" />
      <text
        x={middle}
        y={y + 5}
        textAnchor="middle"
        stroke="none"
        className={`figure ${LETTERS} fill-graphite`}
      >
        480 mm
      </text>
    </g>
  );
}

function faceFill(face: 'A' | 'B'): string {
  return face === 'A' ? 'fill-face-a' : 'fill-face-b';
}

function onBoard(at: number): number {
  return Math.round(Math.min(BOARD.y, Math.max(0, at)));
}
