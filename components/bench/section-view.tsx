'use client';

import type Konva from 'konva';
import { useEffect, useMemo, useRef } from 'react';
import { Layer, Shape, Stage } from 'react-konva';
import { drawSection, type SectionDrawing, type SectionScale } from '@/components/canvas/draw-section';
import type { Size, View } from '@/components/canvas/view';
import { seenJob } from '@/lib/editor/editor-store';
import type { SectionLine } from '@/lib/editor/session';
import { drawingLength, lengthWithUnit } from '@/lib/job/format-length';
import { Button } from '@/components/ui/button';
import { useBench, useEditorState } from './bench-context';
import { LengthField } from './length-field';
import { sectionDrawing } from './section-drawing';
import { useElementSize } from './use-element-size';
import { usePalette } from './use-palette';

/** Room for the letters left of the section and the thickness right of it, px. */
const MARGIN = { x: 56, y: 30 };
/** A thin board is drawn taller than true by up to this, and the heading says so. */
const TALLEST = 5;

/**
 * The board cut along the section line, from the newest proof. Where the line runs level across the plan the section
 * stands under it, on the same x scale.
 */
export function SectionView({ planView }: { planView: View | null }) {
  const { planning } = useBench();
  const frame = useRef<HTMLDivElement>(null);
  const size = useElementSize(frame);
  const palette = usePalette(frame);
  const job = useEditorState(seenJob);
  const { face, section: line } = useEditorState(({ session }) => session);
  const { askSection, stage } = planning;
  useEffect(() => {
    if (stage !== 'problems') askSection(face, line.from, line.to);
  }, [askSection, stage, face, line, planning.report]);

  const drawing = useMemo(
    () => (planning.section ? sectionDrawing(planning.section, job, face, line, planning) : null),
    [planning, job, face, line],
  );
  const scale = size && drawing ? scaleFor(drawing, size, line, planView) : null;
  const tall = scale ? scale.up / scale.along : 1;
  return (
    <section aria-label="Section A–A" className="flex h-full flex-col bg-ground">
      <header className="flex flex-wrap items-baseline gap-x-3 px-3 pt-1">
        <h2 className="text-lg">Section A–A</h2>
        <p className="text-sm text-graphite">{headingWords(tall, line, drawing)}</p>
        <span className="grow" />
        <SectionLineFields line={line} />
      </header>
      <div
        ref={frame}
        className="relative min-h-0 grow overflow-hidden"
        role="img"
        aria-label={sectionWords(drawing, job.display)}
      >
        {size && palette && drawing && scale ? (
          <div className={planning.current ? '' : 'opacity-50'}>
            <Stage width={size.width} height={size.height} listening={false}>
              <Layer listening={false}>
                <Shape
                  listening={false}
                  sceneFunc={(context: Konva.Context) =>
                    drawSection(
                      context._context,
                      scale,
                      drawing,
                      {
                        up: face,
                        down: face === 'A' ? 'B' : 'A',
                        thickness: drawingLength(job.board.z, job.display),
                      },
                      palette,
                    )
                  }
                />
              </Layer>
            </Stage>
          </div>
        ) : (
          <p className="px-3 text-graphite">
            {stage === 'problems'
              ? 'The section comes back as soon as the job can be planned.'
              : 'Cutting the board on paper…'}
          </p>
        )}
      </div>
    </section>
  );
}

/** Level lines share the plan's scale and place, as a drawing projects one view from the other. */
function scaleFor(
  drawing: SectionDrawing,
  size: Size,
  line: SectionLine,
  planView: View | null,
): SectionScale {
  const isLevel = Math.abs(line.to.y - line.from.y) < 1e-6 && line.to.x > line.from.x;
  const fit = (size.width - 2 * MARGIN.x) / Math.max(drawing.length, 1);
  const shared = isLevel && planView ? planView.scale : fit;
  const room = (size.height - 2 * MARGIN.y) / drawing.thickness;
  const up = Math.max(Math.min(room, shared * TALLEST), Math.min(shared, room));
  const x = isLevel && planView ? planView.x + line.from.x * planView.scale : MARGIN.x;
  return { along: shared, up, x, y: (size.height + drawing.thickness * up) / 2 };
}

/** Typed instead of dragged: where a level or upright line runs. */
function SectionLineFields({ line }: { line: SectionLine }) {
  const { editor } = useBench();
  const job = useEditorState(seenJob);
  const isLevel = Math.abs(line.to.y - line.from.y) < 1e-6;
  const isUpright = Math.abs(line.to.x - line.from.x) < 1e-6;
  const { board, display } = job;
  const across = isLevel ? line.from.y : line.from.x;
  return (
    <div className="flex items-center gap-2">
      {isLevel || isUpright ? (
        <div className="w-48">
          <LengthField
            label={isLevel ? 'at y' : 'at x'}
            value={Number(across.toFixed(3))}
            unit={display}
            onCommit={(value) => {
              if (typeof value !== 'number') return 'Write a figure.';
              const section = isLevel
                ? { from: { x: line.from.x, y: value }, to: { x: line.to.x, y: value } }
                : { from: { x: value, y: line.from.y }, to: { x: value, y: line.to.y } };
              editor.look({ section });
              return null;
            }}
          />
        </div>
      ) : null}
      <Button size="small" onClick={() => editor.look({ section: isLevel ? upright(board) : level(board) })}>
        {isLevel ? 'Across' : 'Along'}
      </Button>
    </div>
  );
}

function level({ x, y }: { x: number; y: number }): SectionLine {
  return { from: { x: 0, y: y / 2 }, to: { x, y: y / 2 } };
}

function upright({ x, y }: { x: number; y: number }): SectionLine {
  return { from: { x: x / 2, y: 0 }, to: { x: x / 2, y } };
}

function headingWords(tall: number, line: SectionLine, drawing: SectionDrawing | null): string {
  if (!drawing) return '';
  const height = tall > 1.05 ? `height × ${tall.toFixed(1)} · ` : '';
  const dx = line.to.x - line.from.x;
  const dy = line.to.y - line.from.y;
  const sight =
    Math.abs(dx) >= Math.abs(dy) ? (dx > 0 ? 'the back' : 'the front') : dy > 0 ? 'the left' : 'the right';
  return `${height}seen towards ${sight} edge`;
}

/** What the section shows, for those who do not see it. */
function sectionWords(drawing: SectionDrawing | null, unit: 'mm' | 'in'): string {
  if (!drawing) return 'Section through the board, being worked out';
  const thinnest = thinnestWood(drawing);
  const tabs = drawing.tabs.map(({ label }) => label).join('; ');
  return `Section through the board, ${lengthWithUnit(drawing.length, unit)} long. Thinnest wood ${lengthWithUnit(Number(thinnest.toFixed(1)), unit)}.${tabs ? ` Tabs: ${tabs}.` : ''}`;
}

function thinnestWood({ wood, thickness }: SectionDrawing): number {
  const heights = wood.map(
    (ring) => Math.max(...ring.map(({ y }) => y)) - Math.min(...ring.map(({ y }) => y)),
  );
  return Math.min(thickness, ...heights);
}
