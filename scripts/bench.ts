import { readdirSync } from 'node:fs';
import { fileURLToPath, pathToFileURL } from 'node:url';

/** What a module in scripts/bench exports: it measures and prints. */
interface Benchmark {
  run(): void | Promise<void>;
}

const folder = fileURLToPath(new URL('bench/', import.meta.url));

/**
 * `npm run bench [-- WORD…]`: runs the benchmarks whose names hold one of the words, or all, one after another, each in
 * this one process; run a single one where its neighbours' warm-up would matter.
 */
async function bench(words: readonly string[]): Promise<void> {
  const names = benchmarkNames().filter(
    (name) => words.length === 0 || words.some((word) => name.includes(word)),
  );
  if (names.length === 0) {
    console.error(`No benchmark is called like that; there are: ${benchmarkNames().join(', ') || 'none'}.`);
    process.exitCode = 1;
  }
  for (const name of names) {
    console.log(`\n── ${name}`);
    const began = performance.now();
    await (await loadBenchmark(name)).run();
    console.log(`   ${name} took ${((performance.now() - began) / 1000).toFixed(1)} s`);
  }
}

function benchmarkNames(): string[] {
  return readdirSync(folder)
    .filter((file) => file.endsWith('.ts'))
    .map((file) => file.slice(0, -'.ts'.length))
    .sort();
}

async function loadBenchmark(name: string): Promise<Benchmark> {
  const loaded: unknown = await import(pathToFileURL(`${folder}${name}.ts`).href);
  if (!isBenchmark(loaded)) throw new Error(`scripts/bench/${name}.ts exports no run()`);
  return loaded;
}

function isBenchmark(loaded: unknown): loaded is Benchmark {
  return typeof loaded === 'object' && loaded !== null && 'run' in loaded && typeof loaded.run === 'function';
}

await bench(process.argv.slice(2));
