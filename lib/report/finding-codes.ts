/** How much a finding matters: an error blocks the programs, a warning must be seen. */
export type Severity = 'error' | 'warning';

/**
 * Every finding the engine can make, with its severity, its plain title and what to do about it. Codes are part of
 * the report's contract; titles and mends are for people.
 */
export const FINDING_CODES = {
  'tab-without-wood': {
    severity: 'error',
    title: 'A tab has no wood',
    mend: 'Raise the tab, set its height to auto, or move it to where the far face is not cut.',
  },
  'tab-thin': {
    severity: 'warning',
    title: 'A tab is thin',
    mend: 'Raise the tab, set its height to auto, or ask for less wood to hold.',
  },
  'part-loose': {
    severity: 'error',
    title: 'A piece comes loose',
    mend: 'Give the cut tabs or a skin, or make it less deep.',
  },
  gouge: {
    severity: 'error',
    title: 'A cut goes into the part',
    mend: 'Choose a smaller cutter, or move the cut.',
  },
  'rapid-in-wood': {
    severity: 'error',
    title: 'A rapid goes through wood',
    mend: 'Raise the clearance, or let the cut begin at the face.',
  },
  'clamp-hit': {
    severity: 'error',
    title: 'The cutter would hit a clamp',
    mend: 'Move the clamp, or raise the clearance above it.',
  },
  'pin-hit': {
    severity: 'error',
    title: 'The cutter would hit a pin',
    mend: 'Move the pin, or keep the cut away from it.',
  },
  'outside-travel': {
    severity: 'error',
    title: 'The program is larger than the machine',
    mend: 'Turn the board, make the part smaller, or choose a larger machine.',
  },
  'below-bed': {
    severity: 'error',
    title: 'A cut goes too far into the spoilboard',
    mend: 'Make the cut less deep, or lower what it goes beneath the board.',
  },
  uncut: {
    severity: 'warning',
    title: 'Wood is left that the cutter could reach',
    mend: 'Check the cut’s depth and its outlines.',
  },
  'cutter-too-long-cut': {
    severity: 'error',
    title: 'The cut is deeper than the cutter reaches',
    mend: 'Choose a cutter with longer flutes, or make the cut less deep.',
  },
  'cutter-too-small': {
    severity: 'error',
    title: 'The cutter is too small for the bevel',
    mend: 'Choose a wider V-bit, or make the bevel narrower.',
  },
  'cutter-too-large': {
    severity: 'error',
    title: 'The cutter does not fit',
    mend: 'Choose a smaller cutter, or widen the outline.',
  },
  'no-centre-cut': {
    severity: 'warning',
    title: 'A plunge with a cutter that does not cut at its centre',
    mend: 'Choose a ramp or a helix as entry, or another cutter.',
  },
  'feed-too-high': {
    severity: 'warning',
    title: 'The feed is above the machine’s',
    mend: 'Lower the feed; until then the machine’s limit is used.',
  },
  'speed-out-of-range': {
    severity: 'warning',
    title: 'The spindle cannot turn that fast or slow',
    mend: 'Change the speed; until then the nearest the spindle can do is used.',
  },
  'chip-load': {
    severity: 'warning',
    title: 'The chip is too thin or too thick',
    mend: 'Change feed or speed: too thin burns, too thick breaks the cutter.',
  },
  breakthrough: {
    severity: 'error',
    title: 'Cuts of both faces meet',
    mend: 'Make one of the cuts less deep, or move it.',
  },
  'thin-floor': {
    severity: 'warning',
    title: 'Little wood is left between the faces',
    mend: 'Make one of the cuts less deep.',
  },
  'shallow-on-cup': {
    severity: 'warning',
    title: 'The cut would only scratch the measured surface',
    mend: 'Let the cut follow the surface, or make it deeper.',
  },
  'cut-out-too-early': {
    severity: 'warning',
    title: 'Work is left on a part that was cut out',
    mend: 'Move the cut-out to the end.',
  },
  'turn-mismatch': {
    severity: 'warning',
    title: 'The two zeros are on different edges',
    mend: 'Put both zeros on the same physical corner.',
  },
  'engrave-too-fine': {
    severity: 'warning',
    title: 'Detail too fine for the cutter',
    mend: 'Choose a finer cutter, or make the drawing larger.',
  },
  'text-missing-glyph': {
    severity: 'warning',
    title: 'The font lacks a character',
    mend: 'Choose another font, or change the text.',
  },
} as const satisfies Record<string, { severity: Severity; title: string; mend: string }>;

export type FindingCode = keyof typeof FINDING_CODES;
