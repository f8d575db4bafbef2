import { zeroOf } from '@/lib/job/cut-values';
import type { Job } from '@/lib/job/job-schema';
import { plainNumber } from '@/lib/job/format-length';
import type { Cutter } from '@/lib/job/machine-schema';
import type { CutMoves } from '@/lib/moves/cut-moves';
import { roughSeconds } from '@/lib/moves/rough-seconds';
import { CHECK_PLACE } from './check-code';
import { commentLines } from './comment';
import type { Dialect } from './dialects';
import type { ProgramGroup } from './program-groups';

/** What the whole set of programs is told about itself. */
export interface ProgramInfo {
  /** SHA-256 of the canonical document. */
  readonly jobHash: string;
  /** Number of the fixed revision that the programs are made of. */
  readonly revision?: number;
}

/** Comments that tell the person at the machine what this file is and what it takes for granted. */
export function headComments(
  job: Job,
  group: ProgramGroup,
  file: string,
  info: ProgramInfo,
  dialect: Dialect,
): string[] {
  const { board } = job;
  const { units } = job.machine.controller;
  const sizes = [board.x, board.y, board.z].map((size) => plainNumber(size, 2)).join(' x ');
  const revision = info.revision === undefined ? 'draft' : `revision ${info.revision}`;
  const seconds = roughSeconds(group.steps, job.machine);
  const lines: readonly (readonly [word: string, text: string])[] = [
    ['Check', `${CHECK_PLACE}, file ${file}`],
    ['Job', `${job.name}, ${revision}, ${info.jobHash.slice(0, 12)}`],
    ['Board', `${sizes} mm ${board.material}`],
    ['Face', `${group.face} up, ${zeroWords(job, group.face)}`],
    ...cuttersOf(job, group.steps).map((cutter): [string, string] => ['Cutter', cutterWords(cutter)]),
    ...namesOf(job, group.steps).map((name): [string, string] => ['Cut', name]),
    ['Time', `about ${Math.max(1, Math.round(seconds / 60))} min, units ${units === 'in' ? 'inch' : 'mm'}`],
    ['Caution', 'eyes, ears, lungs protected, work held, run dry above it first'],
  ];
  return lines.flatMap(([word, text]) => commentLines(word, text, dialect.lineLength, dialect.capitals));
}

/** A cutter as the person at the machine looks for it. */
export function cutterWords(cutter: Cutter): string {
  const angle =
    cutter.kind === 'vbit' || cutter.kind === 'drill' ? ` ${plainNumber(cutter.angle, 2)} deg` : '';
  return `T${cutter.number} ${cutter.name}, ${cutter.kind} ${plainNumber(cutter.diameter, 3)} mm${angle}`;
}

function zeroWords(job: Job, face: 'A' | 'B'): string {
  const { corner, z } = job.setups[face]?.zero ?? { corner: 'front-left', z: 'surface' };
  const { x, y } = zeroOf(job, face);
  const height = z === 'bed' ? 'Z0 on the spoilboard under the board' : 'Z0 on this face';
  return `X0 Y0 at its ${corner} (${plainNumber(x, 2)}, ${plainNumber(y, 2)}), ${height}`.replace(
    /[()]/g,
    '',
  );
}

/** Cutters in order of use, repeated where taken up again. */
export function cuttersOf(job: Job, steps: readonly CutMoves[]): Cutter[] {
  const ids = steps.map(({ cutter }) => cutter).filter((id, i, all) => id !== all[i - 1]);
  return ids.flatMap((id) => job.cutters.filter((cutter) => cutter.id === id));
}

function namesOf(job: Job, steps: readonly CutMoves[]): string[] {
  const ids = [...new Set(steps.map(({ cut }) => cut))];
  return ids.map((id) => {
    const name = job.cuts.find((cut) => cut.id === id)?.name ?? '';
    return name === '' ? id : `${id}, ${name}`;
  });
}
