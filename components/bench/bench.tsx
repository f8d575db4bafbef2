'use client';

import { useCallback, useMemo, useState } from 'react';
import { useToast } from '@/components/ui/toast';
import type { View } from '@/components/canvas/view';
import type { Project } from '@/lib/contracts/project';
import { mayInProject } from '@/lib/contracts/roles';
import { createEditor } from '@/lib/editor/editor-store';
import type { Job } from '@/lib/job/job-schema';
import type { FontBook } from '@/lib/outline/fonts';
import { BenchProvider, type Bench as BenchValue, type PanelName } from './bench-context';
import { BenchHeader } from './bench-header';
import { BenchKeys } from './bench-keys';
import { CommentFocusProvider } from './comment-focus';
import { PlanProgress } from './plan-progress';
import { PlanView } from './plan-view';
import { RunStrip } from './run-strip';
import { SaveStatusProvider } from './save-status';
import { SectionView } from './section-view';
import { SidePanel } from './side-panel';
import { ToolRail } from './tool-rail';
import { useAutosave } from './use-autosave';
import { usePlanning } from './use-planning';

interface BenchProps {
  readonly project: Project;
  readonly job: Job;
  readonly version: number;
  readonly fonts: FontBook;
  /** The comment thread that a link led to. */
  readonly comment: string | null;
}

/** The sheet on which a job is seen whole: plan, section, the steps at the machine, and one inspector. */
export function Bench({ project, job, version, fonts, comment }: BenchProps) {
  const [editor] = useState(() => createEditor(job));
  const readOnly = !mayInProject(project.role, 'project.edit');
  const planning = usePlanning(editor, fonts);
  const saving = useAutosave(project.id, version, editor, readOnly);
  const [panel, setPanel] = useState<PanelName | null>(comment ? 'comments' : null);
  const [view, setView] = useState<View | null>(null);
  const toast = useToast();
  const say = useCallback((text: string) => toast({ text }), [toast]);
  const bench = useMemo(
    (): BenchValue => ({ project, editor, fonts, readOnly, planning, panel, openPanel: setPanel, say }),
    [project, editor, fonts, readOnly, planning, panel, say],
  );
  return (
    <BenchProvider value={bench}>
      <SaveStatusProvider value={saving}>
        <CommentFocusProvider start={comment}>
          <BenchKeys />
          <div className="flex h-dvh flex-col overflow-hidden">
            <BenchHeader />
            <main id="main" className="relative flex min-h-0 grow max-sm:flex-col">
              <ToolRail />
              <div className="relative flex min-h-0 min-w-0 grow flex-col">
                <div className="min-h-0 grow-3 basis-0">
                  <PlanView view={view} onView={setView} />
                </div>
                <div className="min-h-0 grow-2 basis-0 border-t border-rule">
                  <SectionView planView={view} />
                </div>
                <PlanProgress />
              </div>
              <SidePanel />
            </main>
            <RunStrip />
          </div>
        </CommentFocusProvider>
      </SaveStatusProvider>
    </BenchProvider>
  );
}
