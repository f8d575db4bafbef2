import type { ExampleId, ProjectState } from '@/lib/contracts/project';
import type { ProjectRole } from '@/lib/contracts/roles';
import type { TagTone } from '@/components/ui/tag';

/** The states of a project in words; the tone only repeats the word. */
export const stateWords: Record<ProjectState, { readonly label: string; readonly tone: TagTone }> = {
  draft: { label: 'draft', tone: 'plain' },
  'in-review': { label: 'in review', tone: 'primary' },
  approved: { label: 'approved', tone: 'ok' },
  cut: { label: 'cut', tone: 'tab' },
};

export const roleWords: Record<ProjectRole, string> = {
  owner: 'owner',
  editor: 'editor',
  reviewer: 'reviewer',
};

export const examples: readonly { readonly id: ExampleId; readonly name: string; readonly about: string }[] =
  [
    {
      id: 'hallway-rail',
      name: 'Hallway rail',
      about:
        'Both faces: a groove and a chamfer beneath; leaves for resin, a chamfer and a cut-out with tabs above.',
    },
    {
      id: 'house-number',
      name: 'House number 27',
      about: 'One face: figures engraved with a V-bit, a groove around them, the cut-out.',
    },
    {
      id: 'drawer-tray',
      name: 'Drawer tray',
      about: 'Pockets of several sizes, cleared with a large cutter and then with a small one.',
    },
    {
      id: 'drill-jig',
      name: 'Drill jig',
      about: 'Holes and slots to tight limits in birch plywood, in inches.',
    },
  ];
