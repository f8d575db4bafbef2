'use client';

import { useRouter } from 'next/navigation';
import { Dialog } from '@/components/ui/dialog';
import { Tabs } from '@/components/ui/tabs';
import type { Project } from '@/lib/contracts/project';
import { readDrawing } from './read-drawing';
import { StartEmpty } from './start-empty';
import { StartFromExample } from './start-from-example';
import { StartFromFile } from './start-from-file';

export type NewProjectWay = 'empty' | 'file' | 'example';

interface NewProjectDialogProps {
  /** The way that is shown; null while the dialog is closed. */
  readonly way: NewProjectWay | null;
  readonly onWayChange: (way: NewProjectWay | null) => void;
}

/** Three ways to begin: an empty board, a drawing, an example. The new project opens at once. */
export function NewProjectDialog({ way, onWayChange }: NewProjectDialogProps) {
  const router = useRouter();
  const open = (project: Project) => router.push(`/projects/${project.id}`);
  return (
    <Dialog
      open={way !== null}
      onOpenChange={() => onWayChange(null)}
      title="New project"
      description="Begin with an empty board, with a drawing, or with a job that is ready."
    >
      <Tabs
        label="Ways to begin"
        value={way ?? 'empty'}
        onChange={onWayChange}
        pages={[
          { value: 'empty', label: 'Empty board', content: <StartEmpty onMade={open} /> },
          {
            value: 'file',
            label: 'SVG file',
            content: <StartFromFile readDrawing={readDrawing} onMade={open} />,
          },
          { value: 'example', label: 'Example', content: <StartFromExample onMade={open} /> },
        ]}
      />
    </Dialog>
  );
}
