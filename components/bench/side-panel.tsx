'use client';

import type { ReactNode } from 'react';
import { IconButton } from '@/components/ui/button';
import { Button } from '@/components/ui/button';
import { classNames } from '@/components/ui/class-names';
import { Notice } from '@/components/ui/notice';
import { EmptyState } from '@/components/ui/states';
import { seenJob } from '@/lib/editor/editor-store';
import { problemLine } from '@/lib/job/parse-job';
import { useBench, useEditorState, type PanelName } from './bench-context';
import { FindingList } from './finding-list';
import { BoardInspector } from './inspector/board-inspector';
import { CutInspector } from './inspector/cut-inspector';
import { OutlineInspector } from './inspector/outline-inspector';
import { CommentsPanel } from './panels/comments-panel';
import { OutlinesPanel } from './panels/outlines-panel';
import { PeoplePanel } from './panels/people-panel';
import { ProgramsPanel } from './panels/programs-panel';

const TITLES: Readonly<Record<PanelName, string>> = {
  selected: 'Selected',
  outlines: 'Outlines',
  board: 'Board',
  programs: 'Programs',
  findings: 'Findings',
  comments: 'Comments',
  people: 'People',
};
const PAGES: Readonly<Record<PanelName, () => ReactNode>> = {
  selected: () => <SelectedPanel />,
  outlines: () => <OutlinesPanel />,
  board: () => <BoardPanel />,
  programs: () => <ProgramsPanel />,
  findings: () => <FindingsPanel />,
  comments: () => <CommentsPanel />,
  people: () => <PeoplePanel />,
};
const ALWAYS: readonly PanelName[] = ['selected', 'outlines', 'board'];

/** The one inspector: beside the plan on a wide screen, over it on a narrow one, where it is opened when wanted. */
export function SidePanel() {
  const { panel, openPanel } = useBench();
  const shown = panel ?? 'selected';
  return (
    <aside
      aria-label={TITLES[shown]}
      className={classNames(
        'flex min-h-0 flex-col border-rule bg-sheet lg:w-88 lg:shrink-0 lg:border-l',
        'max-lg:absolute max-lg:inset-y-0 max-lg:right-0 max-lg:z-30 max-lg:w-full max-lg:max-w-md max-lg:border-l',
        panel === null && 'max-lg:hidden',
      )}
    >
      <nav
        aria-label="Pages of the inspector"
        className="flex items-center gap-1 border-b border-rule px-2 pt-1"
      >
        {[...ALWAYS, ...(ALWAYS.includes(shown) ? [] : [shown])].map((name) => (
          <button
            key={name}
            type="button"
            aria-current={name === shown ? 'page' : undefined}
            onClick={() => openPanel(name)}
            className={classNames(
              'lettering -mb-px min-h-9 border-b-2 px-2 text-lg touch:min-h-touch',
              name === shown ? 'border-primary text-ink' : 'border-transparent text-graphite hover:text-ink',
            )}
          >
            {TITLES[name]}
          </button>
        ))}
        <span className="grow" />
        <IconButton
          icon="close"
          size="small"
          label="Close"
          tooltip="none"
          className="lg:hidden"
          onClick={() => openPanel(null)}
        />
      </nav>
      <div className="min-h-0 grow overflow-y-auto p-4">{PAGES[shown]()}</div>
    </aside>
  );
}

function SelectedPanel() {
  const job = useEditorState(seenJob);
  const selection = useEditorState(({ session }) => session.selection);
  const cut = job.cuts.find(({ id }) => id === selection.cut);
  const outlines = job.outlines.filter(({ id }) => selection.outlines.includes(id));
  if (cut) return <CutInspector key={cut.id} job={job} cut={cut} />;
  if (outlines.length > 0)
    return <OutlineInspector key={selection.outlines.join()} job={job} outlines={outlines} />;
  return <NothingSelected isEmpty={job.outlines.length === 0} />;
}

function NothingSelected({ isEmpty }: { isEmpty: boolean }) {
  const { editor, openPanel, readOnly } = useBench();
  if (readOnly) {
    return (
      <EmptyState title="Look around">
        Select an outline on the plan or a step below to see what is done there. To say something, choose
        “Comment on a spot”.
      </EmptyState>
    );
  }
  return (
    <EmptyState
      title={isEmpty ? 'An empty board' : 'Nothing is selected'}
      actions={
        isEmpty ? (
          <>
            <Button variant="primary" onClick={() => editor.look({ tool: 'rect' })}>
              Draw a rectangle
            </Button>
            <Button onClick={() => openPanel('outlines')}>Bring in a file</Button>
          </>
        ) : undefined
      }
    >
      {isEmpty
        ? 'Draw an outline, or bring in a drawing. Then say what is cut of it.'
        : 'Select an outline on the plan to size it and cut it, or a step on the strip below to change it.'}
    </EmptyState>
  );
}

function BoardPanel() {
  return <BoardInspector job={useEditorState(seenJob)} />;
}

/** Everything the engine noticed, worst first; and why it could not plan at all where it could not. */
function FindingsPanel() {
  const { planning } = useBench();
  if (planning.stage === 'problems') {
    return (
      <Notice kind="error" title="This job cannot be planned yet">
        <ul className="list-disc pl-5">
          {planning.problems.map((problem) => (
            <li key={problem.path}>{problemLine(problem)}</li>
          ))}
        </ul>
      </Notice>
    );
  }
  if (planning.stage === 'failed') {
    return (
      <Notice
        kind="error"
        title="Planning stopped"
        actions={<Button onClick={planning.retry}>Plan again</Button>}
      >
        {planning.message}
      </Notice>
    );
  }
  const findings = planning.report?.findings ?? [];
  if (findings.length === 0) {
    return planning.current ? (
      <Notice kind="ok" title="No findings">
        The programs were read back and swept through the board: nothing is amiss.
      </Notice>
    ) : (
      <p>Proving the programs…</p>
    );
  }
  const worst = [...findings].sort((a, b) => a.severity.localeCompare(b.severity));
  return <FindingList findings={worst} />;
}
