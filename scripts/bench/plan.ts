import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { drawerTray } from '@/lib/job/examples/drawer-tray';
import { drillJig } from '@/lib/job/examples/drill-jig';
import { hallwayRail } from '@/lib/job/examples/hallway-rail';
import { houseNumber } from '@/lib/job/examples/house-number';
import type { JobInput } from '@/lib/job/job-schema';
import { parseJob } from '@/lib/job/parse-job';
import { FONT_CATALOGUE } from '@/lib/outline/font-catalogue';
import type { FontBook } from '@/lib/outline/fonts';
import { proveAndReport } from '@/lib/pipeline/plan-job';
import { planPaths } from '@/lib/pipeline/plan-paths';

/** What a change on the bench may take of a worker's time, warm: new paths, then the proof, ms. */
const BOUNDS = { paths: 50, proof: 1000 };
const RUNS = 5;

/** Planning times of the example jobs: the first run, and the median of warm ones beside the bound for the Hallway rail. */
export async function run(): Promise<void> {
  const fonts = readFonts();
  console.log('job            paths first  paths warm  proof first  proof warm   (ms)');
  for (const job of [hallwayRail, houseNumber, drawerTray, drillJig]) {
    const times = Array.from({ length: RUNS }, () => timesOf(job, fonts));
    const warm = times.slice(1);
    const row = [
      times[0]!.paths,
      median(warm.map(({ paths }) => paths)),
      times[0]!.proof,
      median(warm.map(({ proof }) => proof)),
    ];
    console.log(`${job.name.padEnd(14)} ${row.map((ms) => ms.toFixed(0).padStart(11)).join(' ')}`);
  }
  console.log(`bound, Hallway rail, warm: paths ${BOUNDS.paths} ms, proof ${BOUNDS.proof} ms`);
}

function timesOf(input: JobInput, fonts: FontBook): { paths: number; proof: number } {
  const job = parseJob(input);
  if (!job.ok) throw new Error(JSON.stringify(job.error));
  const began = performance.now();
  const paths = planPaths(job.value, fonts);
  if (!paths.ok) throw new Error(JSON.stringify(paths.error));
  const planned = performance.now();
  proveAndReport(paths.value);
  return { paths: planned - began, proof: performance.now() - planned };
}

function median(values: readonly number[]): number {
  return [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)]!;
}

function readFonts(): FontBook {
  const folder = fileURLToPath(new URL('../../public/fonts/', import.meta.url));
  return new Map(
    FONT_CATALOGUE.map(({ id, file }) => {
      const bytes = readFileSync(`${folder}${file}`);
      return [id, bytes.buffer.slice(bytes.byteOffset, bytes.byteOffset + bytes.byteLength) as ArrayBuffer];
    }),
  );
}
