'use client';

import Link from 'next/link';
import { Button, IconButton } from '@/components/ui/button';
import { HeaderBar } from '@/components/ui/header-bar';
import { Logo } from '@/components/ui/logo';
import { Menu, MenuItem } from '@/components/ui/menu';
import { useComments } from '@/lib/client/use-comments';
import { useBench, useEditorState, type PanelName } from './bench-context';
import { FaceSwitch } from './face-switch';
import { SaveMark } from './save-mark';

/** Name, state and saving on the left, the face in the middle, what comes next on the right. */
export function BenchHeader() {
  return <HeaderBar start={<Start />} centre={<FaceSwitch />} end={<End />} />;
}

function Start() {
  const name = useEditorState(({ history }) => history.present.name);
  return (
    <>
      <Link
        href="/projects"
        className="ring-bar flex min-h-touch shrink-0 items-center"
        aria-label="All projects"
      >
        <Logo />
      </Link>
      <div className="min-w-0">
        <h1 className="truncate text-xl">{name}</h1>
        <p className="truncate text-sm max-sm:sr-only">
          <SaveMark />
        </p>
      </div>
      <UndoButtons />
    </>
  );
}

function UndoButtons() {
  const { editor, readOnly } = useBench();
  const back = useEditorState(({ history }) => history.past.at(-1)?.label);
  const forth = useEditorState(({ history }) => history.future[0]?.label);
  if (readOnly) return null;
  return (
    <div className="flex shrink-0">
      <IconButton
        variant="bar"
        icon="undo"
        label={back ? `Undo: ${back}` : 'Nothing to undo'}
        aria-disabled={!back}
        onClick={editor.undo}
      />
      <IconButton
        variant="bar"
        icon="redo"
        label={forth ? `Redo: ${forth}` : 'Nothing to redo'}
        aria-disabled={!forth}
        onClick={editor.redo}
        className="max-sm:hidden"
      />
    </div>
  );
}

function End() {
  const { planning, openPanel, project } = useBench();
  const comments = useComments(project.id);
  const open = comments.data?.items.filter(({ resolvedAt }) => resolvedAt === null).length ?? 0;
  const findings = planning.report?.findings.length ?? 0;
  const programs = planning.report?.programs.length ?? 0;
  const words: Readonly<Record<string, string>> = {
    comments: open === 1 ? '1 comment' : `${open} comments`,
    findings:
      planning.stage === 'problems'
        ? 'Cannot plan'
        : findings === 0
          ? 'No findings'
          : findings === 1
            ? '1 finding'
            : `${findings} findings`,
  };
  const entries: readonly { panel: PanelName; label: string }[] = [
    { panel: 'people', label: 'People' },
    { panel: 'comments', label: words['comments'] ?? '' },
    { panel: 'findings', label: words['findings'] ?? '' },
  ];
  return (
    <>
      <div className="hidden gap-1 lg:flex">
        {entries.map(({ panel, label }) => (
          <Button key={panel} variant="bar" onClick={() => openPanel(panel)}>
            {label}
          </Button>
        ))}
      </div>
      <Button variant="tab" onClick={() => openPanel('programs')}>
        Programs
        {programs > 0 ? <span className="max-sm:hidden">· {programs}</span> : null}
      </Button>
      <div className="lg:hidden">
        <Menu trigger={<IconButton variant="bar" icon="more" label="More of this project" tooltip="none" />}>
          {[
            { panel: 'selected' as const, label: 'What is selected' },
            { panel: 'outlines' as const, label: 'Outlines' },
            { panel: 'board' as const, label: 'Board and machine' },
            ...entries,
          ].map(({ panel, label }) => (
            <MenuItem key={panel} onSelect={() => openPanel(panel)}>
              {label}
            </MenuItem>
          ))}
        </Menu>
      </div>
    </>
  );
}
