import type { CutKind } from '@/lib/job/cut-schema';

/** One field of a cut, as the inspector shows it. `key` is the document's, dotted where it lies within. */
export interface CutField {
  readonly key: string;
  readonly label: string;
  readonly type:
    | 'length'
    | 'depth'
    | 'angle'
    | 'percent'
    | 'count'
    | 'seconds'
    | 'switch'
    | 'choice'
    | 'pocket'
    | 'flat-cutter';
  readonly options?: readonly { readonly value: string; readonly label: string }[];
  readonly hint?: string;
  /** Shown under "More". */
  readonly more?: true;
}

const DEPTH: CutField = { key: 'depth', label: 'Depth', type: 'depth' };
const DEPTH_FIGURE: CutField = { key: 'depth', label: 'Depth', type: 'length' };
const BELOW: CutField = {
  key: 'below',
  label: 'Beneath the board',
  type: 'length',
  hint: 'How far a through cut goes into the spoilboard.',
  more: true,
};
const DIRECTION: CutField = {
  key: 'direction',
  label: 'Direction',
  type: 'choice',
  options: [
    { value: 'climb', label: 'climb' },
    { value: 'conventional', label: 'conventional' },
  ],
  more: true,
};
const ENTRY: readonly CutField[] = [
  {
    key: 'entry.type',
    label: 'Entry',
    type: 'choice',
    options: [
      { value: 'ramp', label: 'ramp' },
      { value: 'helix', label: 'helix' },
      { value: 'plunge', label: 'plunge' },
    ],
    more: true,
  },
  { key: 'entry.angle', label: 'Entry slope', type: 'angle', more: true },
];
const ALLOWANCE: readonly CutField[] = [
  { key: 'allowance', label: 'Left on walls', type: 'length', more: true },
  { key: 'finish', label: 'Last pass along the walls', type: 'switch', more: true },
];
const RELIEF: CutField = {
  key: 'relief',
  label: 'Inner corners',
  type: 'choice',
  options: [
    { value: 'none', label: 'left round' },
    { value: 'dogbone', label: 'dogbone relief' },
  ],
  more: true,
};
const STEPOVER: CutField = {
  key: 'stepover',
  label: 'Step-over',
  type: 'percent',
  hint: 'Of the cutter’s diameter.',
  more: true,
};

function sides(...values: readonly ('outside' | 'inside' | 'on')[]): CutField {
  const words = { outside: 'outside the outline', inside: 'inside the outline', on: 'on the line' };
  return {
    key: 'side',
    label: 'Side',
    type: 'choice',
    options: values.map((value) => ({ value, label: words[value] })),
  };
}

/** What the inspector offers for each kind of cut, before the fields that all of them share. */
export const CUT_FIELDS: Readonly<Record<CutKind, readonly CutField[]>> = {
  pocket: [
    DEPTH,
    {
      key: 'pattern',
      label: 'Pattern',
      type: 'choice',
      options: [
        { value: 'contour', label: 'along the contour' },
        { value: 'raster', label: 'raster' },
      ],
      more: true,
    },
    { key: 'angle', label: 'Raster angle', type: 'angle', more: true },
    STEPOVER,
    DIRECTION,
    ...ENTRY,
    ...ALLOWANCE,
    { key: 'rest', label: 'Only what is left by', type: 'pocket', more: true },
    RELIEF,
    { key: 'runOut', label: 'Run out over the board’s edge', type: 'switch', more: true },
    BELOW,
  ],
  profile: [
    sides('outside', 'inside', 'on'),
    DEPTH,
    DIRECTION,
    ...ENTRY,
    {
      key: 'lead.type',
      label: 'Lead',
      type: 'choice',
      options: [
        { value: 'none', label: 'none' },
        { value: 'line', label: 'line' },
        { value: 'arc', label: 'arc' },
      ],
      more: true,
    },
    { key: 'lead.length', label: 'Lead length', type: 'length', more: true },
    ...ALLOWANCE,
    { key: 'skin', label: 'Skin left at the far face', type: 'length', more: true },
    {
      key: 'corners',
      label: 'Outer corners',
      type: 'choice',
      options: [
        { value: 'round', label: 'rolled around' },
        { value: 'sharp', label: 'run sharp' },
      ],
      more: true,
    },
    RELIEF,
    BELOW,
  ],
  chamfer: [
    sides('outside', 'inside'),
    { key: 'width', label: 'Width on the face', type: 'length' },
    { key: 'beneath', label: 'Point beneath the bevel', type: 'length', more: true },
  ],
  engrave: [DEPTH],
  'taper-engrave': [
    { ...DEPTH_FIGURE, label: 'Deepest' },
    { key: 'floor', label: 'Floor cleared by', type: 'flat-cutter' },
  ],
  drill: [
    DEPTH,
    { key: 'peck', label: 'Peck', type: 'length', hint: '0 drills in one go.' },
    { key: 'dwell', label: 'Dwell at the bottom', type: 'seconds', more: true },
    BELOW,
  ],
  bore: [DEPTH, { key: 'pitch', label: 'Pitch of the helix', type: 'length', more: true }, BELOW],
  surface: [DEPTH_FIGURE, { key: 'angle', label: 'Angle', type: 'angle' }, STEPOVER],
};

/** Fields that every kind has. */
export const COMMON_FIELDS: readonly CutField[] = [
  {
    key: 'start',
    label: 'Begins below the face',
    type: 'length',
    hint: 'What is above is taken as gone.',
    more: true,
  },
  {
    key: 'follow',
    label: 'Follows',
    type: 'choice',
    options: [
      { value: '', label: 'as suits the cut' },
      { value: 'flat', label: 'the flat face' },
      { value: 'surface', label: 'the measured surface' },
    ],
    more: true,
  },
  {
    key: 'stepdown',
    label: 'Layers of at most',
    type: 'length',
    hint: 'Empty: the cutter’s own.',
    more: true,
  },
];
