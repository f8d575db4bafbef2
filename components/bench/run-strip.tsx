'use client';

import { Fragment } from 'react';
import { classNames } from '@/components/ui/class-names';
import { CUT_NAMES } from '@/lib/editor/edits/new-cut';
import { seenJob } from '@/lib/editor/editor-store';
import type { Cut, CutKind } from '@/lib/job/cut-schema';
import { clockTime, formatLength } from '@/lib/job/format-length';
import type { Job } from '@/lib/job/job-schema';
import { useBench, useEditorState } from './bench-context';

/** Everything that happens at the machine, in order; widths are minutes, with a least. */
export function RunStrip() {
  const { planning } = useBench();
  const job = useEditorState(seenJob);
  const total = planning.report?.seconds;
  const changes = planning.report ? Math.max(0, planning.report.programs.length - 1) : 0;
  return (
    <section aria-label="At the machine" className="border-t border-rule bg-sheet px-4 py-2">
      <h2 className="flex items-baseline gap-3 text-lg whitespace-nowrap">
        At the machine
        <span
          className={classNames(
            'truncate font-sans text-sm font-normal text-graphite',
            !planning.current && 'opacity-60',
          )}
        >
          {total === undefined
            ? 'working out the time…'
            : `about ${minutes(total)} · ${changes} changes of cutter or face`}
        </span>
      </h2>
      <ol className="flex gap-1 overflow-x-auto pt-1 pb-1">
        {job.order.map((face, index) => (
          <Fragment key={face}>
            {index > 0 ? (
              <Fixed
                title="Turn over"
                note={job.turn.axis === 'x' ? 'towards you' : 'like a page'}
                sign="turn"
              />
            ) : null}
            <Fixed
              title={index === 0 ? 'Clamp, zero' : 'Zero again'}
              note={`${face} up, ${zeroWords(job, face)}`}
              sign="clamp"
            />
            {cardsOf(job, face).map(({ cut, cutterName }) => (
              <Fragment key={cut.id}>
                {cutterName === null ? null : <Seam name={cutterName} />}
                <CutCard job={job} cut={cut} />
              </Fragment>
            ))}
          </Fragment>
        ))}
      </ol>
      {job.cuts.length === 0 ? (
        <p className="pb-1 text-graphite">
          Nothing is cut yet. Select an outline on the plan and say what becomes of it.
        </p>
      ) : null}
    </section>
  );
}

/** Cuts of one face in order, each with the name of its cutter where it is not the one before. */
function cardsOf(job: Job, face: 'A' | 'B'): readonly { cut: Cut; cutterName: string | null }[] {
  let before: string | null = null;
  return job.cuts
    .filter((cut) => cut.face === face)
    .map((cut) => {
      const isChange = cut.enabled && cut.cutter !== before;
      if (isChange) before = cut.cutter;
      const name = job.cutters.find(({ id }) => id === cut.cutter)?.name ?? cut.cutter;
      return { cut, cutterName: isChange ? name : null };
    });
}

function CutCard({ job, cut }: { job: Job; cut: Cut }) {
  const { editor, planning, openPanel } = useBench();
  const chosen = useEditorState(({ session }) => session.selection.cut === cut.id);
  const report = planning.report?.cuts.find(({ id }) => id === cut.id);
  const worst = worstFinding(planning.report?.findings.filter((finding) => finding.cut === cut.id) ?? []);
  const name = cut.name || CUT_NAMES[cut.kind];
  // Two pixels a second up to five minutes: long cuts are seen to be long, short ones stay readable.
  const width = Math.min(320, Math.max(116, (report?.seconds ?? 0) / 2));
  return (
    <li style={{ flex: `0 0 ${Math.round(width)}px` }}>
      <button
        type="button"
        aria-pressed={chosen}
        onClick={() => {
          editor.look({ face: cut.face });
          editor.select({ cut: cut.id, outlines: [] });
          openPanel('selected');
        }}
        className={classNames(
          'grid h-full w-full content-start gap-0.5 rounded-sm border border-t-4 px-2 py-1.5 text-left',
          cut.face === 'A' ? 'border-t-face-a-fill' : 'border-t-face-b-fill',
          chosen ? 'border-x-tab border-b-tab bg-select' : 'border-x-rule border-b-rule bg-well',
          !cut.enabled && 'opacity-55',
        )}
      >
        <span className="flex items-center justify-between gap-1">
          <CutSign kind={cut.kind} />
          {worst ? (
            <span
              className={classNames('text-sm font-medium', worst === 'error' ? 'text-error' : 'text-warning')}
            >
              {worst === 'error' ? '■ error' : '▲ look'}
            </span>
          ) : null}
        </span>
        <span className="lettering truncate text-base">{name}</span>
        <span className="figure truncate text-sm text-graphite">
          {cut.enabled
            ? `${report ? clockTime(report.seconds) : '–:––'} · ${depthWords(job, cut)}`
            : 'left out'}
        </span>
      </button>
    </li>
  );
}

function Fixed({ title, note, sign }: { title: string; note: string; sign: 'clamp' | 'turn' }) {
  return (
    <li className="grid shrink-0 basis-28 content-start gap-0.5 rounded-sm border border-t-4 border-rule border-t-ink bg-well px-2 py-1.5">
      <Sign
        d={sign === 'clamp' ? 'M2 16h28M8 16V6h10v10M5 6h16' : 'M3 14c6-10 18-10 24 0M27 14l-5-1M27 14l2-5'}
      />
      <span className="lettering text-base">{title}</span>
      <span className="truncate text-sm text-graphite">{note}</span>
    </li>
  );
}

/** Where the cutter is changed. */
function Seam({ name }: { name: string }) {
  return (
    <li
      className="flex shrink-0 items-center border-l-2 border-dotted border-graphite pl-0.5"
      aria-label={`Change to ${name}`}
    >
      <span className="max-h-20 truncate text-sm text-graphite [writing-mode:vertical-rl]">{name}</span>
    </li>
  );
}

/** Sections of the board as each kind of cut leaves it. */
const CUT_SIGNS: Readonly<Record<CutKind, string>> = {
  pocket: 'M1 4h8v10h14V4h8',
  profile: 'M1 4h9v12M22 16V4h9M10 16v-4M22 12v4',
  chamfer: 'M1 14l8-10h22',
  engrave: 'M1 4h12l3 6 3-6h12',
  'taper-engrave': 'M1 4h6l9 12 9-12h6',
  drill: 'M1 4h11v9l4 3 4-3V4h11',
  bore: 'M1 4h7v12h16V4h7',
  surface: 'M1 8h20V4h10M1 16h30',
};

export function CutSign({ kind }: { kind: CutKind }) {
  return <Sign d={CUT_SIGNS[kind]} />;
}

function Sign({ d }: { d: string }) {
  return (
    <svg
      width="32"
      height="18"
      viewBox="0 0 32 18"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.75"
      aria-hidden
    >
      <path d={d} />
    </svg>
  );
}

function worstFinding(findings: readonly { severity: 'error' | 'warning' }[]): 'error' | 'warning' | null {
  if (findings.some(({ severity }) => severity === 'error')) return 'error';
  return findings.length > 0 ? 'warning' : null;
}

function depthWords(job: Job, cut: Cut): string {
  if (cut.kind === 'chamfer') return `${formatLength(cut.width, job.display)} wide`;
  return cut.depth === 'through' ? 'through' : `${formatLength(cut.start + cut.depth, job.display)} deep`;
}

function zeroWords(job: Job, face: 'A' | 'B'): string {
  return job.setups[face]?.zero.corner.replace('-', ' ') ?? '';
}

function minutes(seconds: number): string {
  return seconds < 90 ? `${Math.round(seconds)} seconds` : `${Math.round(seconds / 60)} minutes`;
}
