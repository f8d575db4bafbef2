import fc from 'fast-check';

const DEFAULT_RUNS = 2_000;

/** How many cases each property gets: RUNS, or enough for a first look. */
function runCount(): number {
  const wanted = process.env.RUNS;
  if (wanted === undefined) return DEFAULT_RUNS;
  const runs = Number(wanted);
  if (!Number.isSafeInteger(runs) || runs <= 0)
    throw new Error(`RUNS must be a positive whole number, not ${wanted}`);
  return runs;
}

fc.configureGlobal({ numRuns: runCount() });
