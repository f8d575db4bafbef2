'use client';

import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { EmptyState, ErrorState, LoadingState } from '@/components/ui/states';
import { Tag } from '@/components/ui/tag';
import { sentenceOf } from '@/lib/client/api-error';
import { usePrograms } from '@/lib/client/use-programs';
import type { ProgramItem, ProgramList } from '@/lib/contracts/plan';
import { CUT_NAMES } from '@/lib/editor/edits/new-cut';
import { seenJob } from '@/lib/editor/editor-store';
import { clockTime } from '@/lib/job/format-length';
import { useBench, useEditorState } from '../bench-context';
import { FindingList } from '../finding-list';
import { useSaveStatus } from '../save-status';

/** What the machine gets, in order: each program with its cutter, minutes and size, to download one by one or all. */
export function ProgramsPanel() {
  const { project } = useBench();
  const { state, version } = useSaveStatus();
  const programs = usePrograms(project.id, version);
  if (state.kind !== 'saved') {
    return (
      <Notice title="Not on the server yet">
        Programs are made of what is saved.{' '}
        {state.kind === 'saving'
          ? 'This takes a moment.'
          : 'They appear here as soon as the change is saved.'}
      </Notice>
    );
  }
  if (programs.isPending) return <LoadingState title="Planning and proving the programs" />;
  if (programs.isError)
    return (
      <ErrorState title="The programs could not be made" onRetry={() => void programs.refetch()}>
        {sentenceOf(programs.error)}
      </ErrorState>
    );
  if (programs.data.programs.length === 0)
    return (
      <EmptyState title="No program yet">Select an outline on the plan and say what is cut of it.</EmptyState>
    );
  return <Programs list={programs.data} />;
}

function Programs({ list }: { list: ProgramList }) {
  return (
    <div className="grid gap-4">
      {list.blocked ? (
        <Notice kind="error" title="These programs are not handed out yet">
          An error below must be mended first: cut as they are, they would spoil the part or worse.
        </Notice>
      ) : (
        <Cautions />
      )}
      <ol className="grid gap-2">
        {list.programs.map((program, index) => (
          <ProgramCard key={program.file} program={program} number={index + 1} blocked={list.blocked} />
        ))}
      </ol>
      {list.blocked ? null : (
        <Button variant="primary" icon="download" asChild>
          <a href={list.archive} download>
            Download all ({clockTime(list.seconds)} at the machine)
          </a>
        </Button>
      )}
      <FindingList findings={list.findings} />
    </div>
  );
}

function ProgramCard({
  program,
  number,
  blocked,
}: {
  program: ProgramItem;
  number: number;
  blocked: boolean;
}) {
  const job = useEditorState(seenJob);
  const cutters = program.cutters.map((id) => job.cutters.find((cutter) => cutter.id === id)?.name ?? id);
  const cuts = program.cuts.map((id) => {
    const cut = job.cuts.find((other) => other.id === id);
    return cut ? cut.name || CUT_NAMES[cut.kind] : id;
  });
  const { min, max } = program.bounds;
  const spans = [0, 1, 2].map((axis) => `${(min[axis] ?? 0).toFixed(1)} … ${(max[axis] ?? 0).toFixed(1)}`);
  return (
    <li className="grid gap-1 rounded border border-rule p-3">
      <p className="flex flex-wrap items-center gap-2">
        <span className="figure text-graphite">{number}</span>
        <strong className="figure font-medium">{program.file}</strong>
        <Tag>face {program.face}</Tag>
      </p>
      <p>{cuts.join(', ')}</p>
      <p className="text-graphite">{cutters.join(', ')}</p>
      <p className="figure text-sm text-graphite">
        {clockTime(program.seconds)} · {program.lines} lines · {sizeWords(program.bytes)}
      </p>
      <p className="figure text-sm text-graphite">
        X {spans[0]} · Y {spans[1]} · Z {spans[2]} mm
      </p>
      {blocked ? null : (
        <Button size="small" icon="download" asChild className="justify-self-start">
          <a href={program.href} download={program.file}>
            Download
          </a>
        </Button>
      )}
    </li>
  );
}

/** Shown wherever a program is handed over. */
export function Cautions() {
  return (
    <Notice kind="warning" title="Before you cut">
      <ul className="list-disc pl-5">
        <li>Wear eye, ear and breathing protection and run the dust extraction.</li>
        <li>Make sure that the work is held, keep hands away and know where the emergency stop is.</li>
        <li>Run the program dry above the work first.</li>
        <li>
          The machine maker’s manual, local codes and trained people come first. Times, speeds and holding
          forces here are estimates.
        </li>
      </ul>
    </Notice>
  );
}

function sizeWords(bytes: number): string {
  return bytes < 10_000 ? `${bytes} bytes` : `${Math.round(bytes / 1000)} kB`;
}
