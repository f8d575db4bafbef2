import { cutSpeeds, zeroOf } from '@/lib/job/cut-values';
import type { Job } from '@/lib/job/job-schema';
import type { CutMoves } from '@/lib/moves/cut-moves';
import type { LineMapEntry, ProgramIntent } from '@/lib/report/intent';
import { withCheckCode } from './check-code';
import { commentLines } from './comment';
import { DIALECTS, type Dialect } from './dialects';
import { createMotionWriter, type MotionWriter } from './motion-writer';
import { plainWord, type NumberFormat } from './number-word';
import { cutterWords, cuttersOf, headComments, type ProgramInfo } from './program-head';
import { groupSteps, programFile, type ProgramGroup } from './program-groups';

export type { ProgramInfo } from './program-head';

/**
 * The programs of a resolved job, in the order in which they are run. Each stands alone: it states its modes, retracts
 * before it travels, turns the spindle on and off. Same document, same bytes.
 */
export function writePrograms(job: Job, steps: readonly CutMoves[], info: ProgramInfo): ProgramIntent[] {
  const { toolChange } = job.machine.controller;
  return groupSteps(steps, toolChange).map((group, index) => {
    const file = programFile(index, group, toolChange);
    const { text, lineMap } = writeProgram(job, group, { file, index, info });
    return {
      file,
      face: group.face,
      cutters: cuttersOf(job, group.steps).map(({ id }) => id),
      cuts: [...new Set(group.steps.map(({ cut }) => cut))],
      text,
      lineMap,
    };
  });
}

/** What a line number and its blank take of a line: N and five digits. */
const NUMBER_ROOM = 7;

interface Naming {
  readonly file: string;
  readonly index: number;
  readonly info: ProgramInfo;
}

function writeProgram(
  job: Job,
  group: ProgramGroup,
  naming: Naming,
): { text: string; lineMap: LineMapEntry[] } {
  const { machine } = job;
  const { controller } = machine;
  const own = DIALECTS[controller.dialect];
  const dialect = controller.lineNumbers ? { ...own, lineLength: own.lineLength - NUMBER_ROOM } : own;
  const lines: string[] = [];
  const lineMap: LineMapEntry[] = [];
  const push = (line: string): void => void lines.push(line);
  const mark = (cut: string | null, cutter: string | null): void =>
    void lineMap.push({ line: lines.length + 1, cut, cutter });
  const motion = createMotionWriter(
    { format: numberFormat(job), zero: zeroOf(job, group.face), arcs: controller.arcs },
    push,
  );
  const state: SpindleState = { rpm: null, cutter: null };

  mark(null, null);
  if (dialect.percent) push('%');
  if (dialect.programNumber) push(`O${String(naming.index + 1).padStart(4, '0')}`);
  headComments(job, group, naming.file, naming.info, dialect).forEach(push);
  startBlock(job, dialect).forEach(push);
  motion.rapidZ(machine.clearance);
  for (const step of group.steps) {
    mark(step.cut, step.cutter);
    prepareCutter(job, step, { dialect, motion, state, push });
    for (const move of step.moves) motion.write(move);
  }
  mark(null, null);
  motion.rapidZ(machine.clearance);
  push('M5');
  push('M30');
  if (dialect.percent) push('%');
  return { text: textOf(lines, controller.lineNumbers), lineMap };
}

function numberFormat({ machine: { controller } }: Job): NumberFormat {
  const inch = controller.units === 'in';
  return { unit: inch ? 25.4 : 1, decimals: controller.decimals ?? (inch ? 5 : 4) };
}

/** Everything a program takes for granted, said: a machine may have been left in any state. */
function startBlock(job: Job, dialect: Dialect): string[] {
  const { units, arcs } = job.machine.controller;
  const blend =
    dialect.blend === null
      ? []
      : [plainWord('G64 P', units === 'in' ? dialect.blend / 25.4 : dialect.blend, 4)];
  return [
    units === 'in' ? 'G20' : 'G21',
    'G17',
    'G90',
    ...(arcs && dialect.arcModeWord ? ['G91.1'] : []),
    'G94',
    'G40',
    'G49',
    'G80',
    'G54',
    ...blend,
  ];
}

interface SpindleState {
  rpm: number | null;
  cutter: string | null;
}

interface Writing {
  readonly dialect: Dialect;
  readonly motion: MotionWriter;
  readonly state: SpindleState;
  readonly push: (line: string) => void;
}

/** Before a cut: the right cutter in the spindle, turning as fast as the cut asks. */
function prepareCutter(job: Job, step: CutMoves, { dialect, motion, state, push }: Writing): void {
  const { machine } = job;
  const { controller, spindle } = machine;
  const cut = job.cuts.find(({ id }) => id === step.cut);
  const cutter = job.cutters.find(({ id }) => id === step.cutter);
  if (!cut || !cutter) throw new Error(`No cut '${step.cut}' or cutter '${step.cutter}'`);
  const isFirst = state.cutter === null;
  const isChange = state.cutter !== step.cutter;
  if (isChange) {
    if (!isFirst) {
      motion.rapidZ(machine.clearance);
      push('M5');
    }
    const changes = controller.toolChange === 'm6' && dialect.toolChange;
    if (changes) {
      push(`T${cutter.number} M6`);
      if (dialect.toolLength) push(`G43 H${cutter.number}`);
    } else if (!isFirst) {
      commentLines('Put in', cutterWords(cutter), dialect.lineLength, dialect.capitals).forEach(push);
      push('M0');
    }
    if (changes || !isFirst) motion.forget();
    motion.rapidZ(machine.clearance);
    state.cutter = step.cutter;
    state.rpm = null;
  }
  const own = cut.cutter === step.cutter ? cutSpeeds(job, cut).rpm : cutter.speeds.rpm;
  const rpm = Math.round(Math.min(Math.max(own, spindle.min), spindle.max));
  if (rpm === state.rpm) return;
  push(state.rpm === null ? `S${rpm} M3` : `S${rpm}`);
  if (controller.spinUp > 0) push(plainWord('G4 P', controller.spinUp, 3));
  state.rpm = rpm;
}

/** Numbered by tens where they fit into five digits (NIST RS274NGC 3.3.1), else by ones from the start again. */
function textOf(lines: readonly string[], numbered: boolean): string {
  if (!numbered) return withCheckCode(`${lines.join('\n')}\n`);
  const step = lines.length * 10 <= 99_999 ? 10 : 1;
  let count = 0;
  const all = lines.map((line) => {
    if (line === '%' || /^O\d/.test(line)) return line;
    count++;
    return `N${(count * step) % 100_000} ${line}`;
  });
  return withCheckCode(`${all.join('\n')}\n`);
}
