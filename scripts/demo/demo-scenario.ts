import type { CommentPin } from '@/lib/contracts/comment';
import type { ExampleId, ProjectState } from '@/lib/contracts/project';
import type { GivenRole } from '@/lib/contracts/member';
import type { ShopRole } from '@/lib/contracts/roles';

/** The demo: an invented shared workshop with its people and what they are making. */
export const DEMO_SHOP = 'Quayside Tool Library';

export type DemoPersonId = 'steward' | 'maker' | 'reviewer';

export const DEMO_PEOPLE: Readonly<Record<DemoPersonId, { name: string; email: string; role: ShopRole }>> = {
  steward: { name: 'Tove Marsh', email: 'steward@quayside.test', role: 'steward' },
  maker: { name: 'Ines Calder', email: 'maker@quayside.test', role: 'maker' },
  reviewer: { name: 'Jon Ferrow', email: 'reviewer@quayside.test', role: 'reviewer' },
};

export interface DemoComment {
  readonly author: DemoPersonId;
  readonly pin: CommentPin;
  readonly text: string;
  readonly replies?: readonly { readonly author: DemoPersonId; readonly text: string }[];
  readonly resolvedBy?: DemoPersonId;
}

export interface DemoProject {
  readonly example: ExampleId;
  readonly state: ProjectState;
  readonly owner: DemoPersonId;
  readonly members: Readonly<Partial<Record<DemoPersonId, GivenRole>>>;
  /** Hours before the seed that it was last changed. */
  readonly hoursAgo: number;
  readonly revision?: string;
  readonly comments: readonly DemoComment[];
}

export const DEMO_PROJECTS: readonly DemoProject[] = [
  {
    example: 'hallway-rail',
    state: 'in-review',
    owner: 'maker',
    members: { steward: 'editor', reviewer: 'reviewer' },
    hoursAgo: 2,
    revision: 'First version for the client.',
    comments: [
      {
        author: 'reviewer',
        pin: { kind: 'spot', face: 'A', x: 240, y: 70 },
        text: 'Could the leaves sit a little lower, so that the hooks do not cover them?',
        replies: [{ author: 'maker', text: 'Yes, I can move them down by 10 mm.' }],
      },
      {
        author: 'steward',
        pin: { kind: 'cut', cut: 'cut-out' },
        text: 'The tabs must clear the chamfer on the back. Leave their height on auto.',
        replies: [{ author: 'maker', text: 'Done, they are on auto.' }],
        resolvedBy: 'maker',
      },
      {
        author: 'reviewer',
        pin: { kind: 'spot', face: 'B', x: 60, y: 100 },
        text: 'Good that the mark is on the back.',
      },
    ],
  },
  {
    example: 'house-number',
    state: 'approved',
    owner: 'maker',
    members: { reviewer: 'reviewer' },
    hoursAgo: 30,
    revision: 'Approved on paper, figures as drawn.',
    comments: [
      {
        author: 'reviewer',
        pin: { kind: 'cut', cut: 'figures' },
        text: 'Deep enough to be read from the street?',
        replies: [{ author: 'maker', text: 'The strokes come out about 5 mm wide, that reads well.' }],
        resolvedBy: 'reviewer',
      },
    ],
  },
  {
    example: 'drawer-tray',
    state: 'draft',
    owner: 'maker',
    members: { steward: 'editor' },
    hoursAgo: 72,
    comments: [],
  },
  {
    example: 'drill-jig',
    state: 'draft',
    owner: 'steward',
    members: { maker: 'editor' },
    hoursAgo: 150,
    comments: [
      {
        author: 'maker',
        pin: { kind: 'cut', cut: 'bushes' },
        text: 'Which bushes go in here? I would leave 0.05 mm on the walls and ream.',
      },
    ],
  },
];
