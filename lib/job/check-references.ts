import type { Problem } from '@/lib/report/problem';
import type { Surface } from './board-schema';
import type { Cut, CutKind } from './cut-schema';
import type { Job } from './job-schema';
import type { Cutter, CutterKind } from './machine-schema';
import { FONT_IDS } from './shape-schema';

/** Problems between the parts of a document that fits the schema: ids that lead nowhere, doubles, a cutter that cannot. */
export function checkReferences(job: Job): Problem[] {
  return [
    ...doubles(job.cutters, 'cutters'),
    ...doubleNumbers(job.cutters),
    ...doubles(job.outlines, 'outlines'),
    ...doubles(job.cuts, 'cuts'),
    ...checkFaces(job),
    ...checkSurfaces(job),
    ...checkMachine(job),
    ...job.cutters.flatMap(checkCutter),
    ...checkFonts(job),
    ...job.cuts.flatMap((cut, index) => checkCut(job, cut, index)),
  ];
}

function doubles(items: readonly { id: string }[], list: string): Problem[] {
  const first = new Map<string, number>();
  return items.flatMap(({ id }, index) => {
    const before = first.get(id);
    if (before === undefined) {
      first.set(id, index);
      return [];
    }
    return [{ path: `${list}[${index}].id`, message: `'${id}' is already the id of ${list}[${before}].` }];
  });
}

function doubleNumbers(cutters: readonly Cutter[]): Problem[] {
  const first = new Map<number, string>();
  return cutters.flatMap(({ number, id }, index) => {
    const before = first.get(number);
    if (before === undefined) {
      first.set(number, id);
      return [];
    }
    return [{ path: `cutters[${index}].number`, message: `${number} is already the number of '${before}'.` }];
  });
}

function checkFaces(job: Job): Problem[] {
  const problems: Problem[] = [];
  if (job.order.length === 2 && job.order[0] === job.order[1]) {
    problems.push({ path: 'order[1]', message: `face ${job.order[1]} is named twice.` });
  }
  for (const face of new Set(job.order)) {
    if (!job.setups[face]) {
      problems.push({ path: `setups.${face}`, message: `is missing; face ${face} is in the order.` });
    }
  }
  job.cuts.forEach((cut, index) => {
    if (cut.enabled && !job.order.includes(cut.face)) {
      problems.push({ path: `cuts[${index}].face`, message: `face ${cut.face} is not in the order.` });
    }
  });
  return problems;
}

function checkSurfaces(job: Job): Problem[] {
  return (['A', 'B'] as const).flatMap((face) =>
    checkSurface(job.board.surface[face], `board.surface.${face}`),
  );
}

function checkSurface(surface: Surface, path: string): Problem[] {
  if (surface?.kind !== 'grid') return [];
  const problems: Problem[] = [];
  for (const axis of ['x', 'y'] as const) {
    const falls = surface[axis].findIndex((value, i) => i > 0 && value <= surface[axis][i - 1]!);
    if (falls > 0)
      problems.push({ path: `${path}.${axis}[${falls}]`, message: 'must be larger than the one before it.' });
  }
  if (surface.z.length !== surface.y.length) {
    problems.push({
      path: `${path}.z`,
      message: `has ${surface.z.length} rows; y has ${surface.y.length} values.`,
    });
  }
  surface.z.forEach((row, index) => {
    if (row.length !== surface.x.length) {
      problems.push({
        path: `${path}.z[${index}]`,
        message: `has ${row.length} heights; x has ${surface.x.length} values.`,
      });
    }
  });
  return problems;
}

function checkMachine({ machine }: Job): Problem[] {
  const problems: Problem[] = [];
  if (machine.spindle.min > machine.spindle.max) {
    problems.push({
      path: 'machine.spindle.min',
      message: `must not be above spindle.max (${machine.spindle.max}).`,
    });
  }
  const { dialect, toolChange } = machine.controller;
  if (dialect === 'grbl' && toolChange === 'm6') {
    problems.push({
      path: 'machine.controller.toolChange',
      message: "grbl has no M6; use 'split' or 'pause'.",
    });
  }
  if (machine.approach > machine.clearance) {
    problems.push({
      path: 'machine.approach',
      message: `must not be above clearance (${machine.clearance}).`,
    });
  }
  return problems;
}

function checkCutter(cutter: Cutter, index: number): Problem[] {
  if (cutter.kind !== 'vbit' || cutter.tip < cutter.diameter) return [];
  return [
    { path: `cutters[${index}].tip`, message: `must be smaller than the diameter (${cutter.diameter}).` },
  ];
}

function checkFonts(job: Job): Problem[] {
  return job.outlines.flatMap(({ shape }, index) => {
    if (shape.type !== 'text' || FONT_IDS.some((font) => font === shape.font)) return [];
    const message = `no font '${shape.font}'; the catalogue has ${FONT_IDS.join(', ')}.`;
    return [{ path: `outlines[${index}].shape.font`, message }];
  });
}

/** Which kinds of cutter can make which kind of cut. */
export const CUTTERS_FOR: Readonly<Record<CutKind, readonly CutterKind[]>> = {
  pocket: ['flat', 'ball'],
  profile: ['flat', 'ball', 'vbit'],
  chamfer: ['vbit'],
  engrave: ['flat', 'ball', 'vbit'],
  'taper-engrave': ['vbit'],
  drill: ['drill', 'flat', 'ball', 'vbit'],
  bore: ['flat', 'ball'],
  surface: ['flat', 'ball'],
};

const CUTTER_WORDS: Readonly<Record<CutterKind, string>> = {
  flat: 'flat cutter',
  ball: 'ball cutter',
  vbit: 'V-bit',
  drill: 'drill',
};

function checkCut(job: Job, cut: Cut, index: number): Problem[] {
  const path = `cuts[${index}]`;
  const problems = [...checkCutterOfCut(job, cut, path), ...checkOutlines(job, cut, path)];
  if (cut.kind === 'pocket' && cut.rest !== null) problems.push(...checkRest(job, cut.rest, cut.face, index));
  if (cut.kind === 'taper-engrave' && cut.floor !== null) problems.push(...checkFloor(job, cut.floor, path));
  if (cut.kind === 'profile' && cut.tabs?.placement.type === 'at') {
    cut.tabs.placement.at.forEach(({ outline }, i) => {
      if (!cut.outlines.includes(outline)) {
        problems.push({
          path: `${path}.tabs.placement.at[${i}].outline`,
          message: `the cut has no outline '${outline}'.`,
        });
      }
    });
  }
  return problems;
}

function checkCutterOfCut(job: Job, cut: Cut, path: string): Problem[] {
  const cutter = job.cutters.find(({ id }) => id === cut.cutter);
  if (!cutter) return [{ path: `${path}.cutter`, message: `no cutter '${cut.cutter}'.` }];
  const may = CUTTERS_FOR[cut.kind];
  if (may.includes(cutter.kind)) return [];
  const wanted = may.map((kind) => `a ${CUTTER_WORDS[kind]}`).join(' or ');
  return [
    {
      path: `${path}.cutter`,
      message: `a ${cut.kind} needs ${wanted}; '${cutter.id}' is a ${CUTTER_WORDS[cutter.kind]}.`,
    },
  ];
}

function checkOutlines(job: Job, cut: Cut, path: string): Problem[] {
  const known = new Set(job.outlines.map(({ id }) => id));
  return cut.outlines.flatMap((id, index) => {
    if (!known.has(id)) return [{ path: `${path}.outlines[${index}]`, message: `no outline '${id}'.` }];
    if (cut.outlines.indexOf(id) !== index) {
      return [{ path: `${path}.outlines[${index}]`, message: `'${id}' is named twice.` }];
    }
    return [];
  });
}

function checkRest(job: Job, rest: string, face: string, index: number): Problem[] {
  const path = `cuts[${index}].rest`;
  const before = job.cuts.findIndex(({ id }) => id === rest);
  const other = job.cuts[before];
  if (!other) return [{ path, message: `no cut '${rest}'.` }];
  if (other.kind !== 'pocket') return [{ path, message: `'${rest}' is not a pocket.` }];
  if (before >= index) return [{ path, message: `'${rest}' must come earlier.` }];
  return other.face === face ? [] : [{ path, message: `'${rest}' is on the other face.` }];
}

function checkFloor(job: Job, floor: string, path: string): Problem[] {
  const cutter = job.cutters.find(({ id }) => id === floor);
  if (!cutter) return [{ path: `${path}.floor`, message: `no cutter '${floor}'.` }];
  return cutter.kind === 'flat'
    ? []
    : [{ path: `${path}.floor`, message: `needs a flat cutter; '${floor}' is not.` }];
}
