import { ingestOverHttp } from './ingest-over-http';
import { measureStages } from './ingest-stages';
import { mean, type Measured, ratioOf } from './measure-rounds';
import { syntheticSweep } from './synthetic-sweep';

const SWEEPS = 1_000;
const WARM_UP = 60;

/*
 * Import of 1,000 sweeps of 6,634 points through the interface, against parsing alone and inserting alone in the same run.
 * Milliseconds belong to the machine and the moment; ratios are what to compare.
 */
const files = Array.from({ length: SWEEPS + WARM_UP }, (_, seed) => syntheticSweep(seed + 1));
const http = await ingestOverHttp(files.slice(0, SWEEPS), files.slice(SWEEPS));
const stages = measureStages(files.slice(0, SWEEPS));

const cpu = (measured: Measured): number => mean(measured.cpuMs);
const importMs = cpu(stages.importOneEach);
const parts = [
  ['hash of the file', cpu(stages.hash)],
  ['read the text', cpu(stages.parse)],
  ['hashes, margins, cells', cpu(stages.margins)],
  ['pack the levels', cpu(stages.pack)],
  ['keep the original', cpu(stages.keep) - cpu(stages.hash)],
] as const;
const counted = parts.reduce((sum, [, cpuMs]) => sum + cpuMs, 0);

print(`${SWEEPS} sweeps of 6,634 points (${(files[0]?.length ?? 0) >> 10} KiB each) over HTTP, 4 in flight`);
print(
  `  ${http.sweepsPerSecond.toFixed(0)} sweeps/s; a request takes ${at(0.5)} ms, at the 95th percentile ${at(0.95)} ms`,
);
print(
  `  ${http.serverCpuMs.toFixed(2)} ms of server CPU and ${(http.databaseBytesPerSweep / 1000).toFixed(1)} kB of database a sweep`,
);
print('where the CPU time of a sweep goes');
for (const [name, cpuMs] of parts) part(name, cpuMs);
part('rows, roll-up, transaction', importMs - counted);
part('HTTP, multipart, answer', http.serverCpuMs - importMs);
print('ratios of CPU time (least to greatest of the rounds)');
ratio('reading / SHA-256 of the file', stages.parse, [stages.hash]);
ratio('import, one transaction each / SHA-256 + BLOB insert each', stages.importOneEach, [
  stages.hash,
  stages.insertOneEach,
]);
ratio('import, 20 a transaction / SHA-256 + BLOB insert, 20 each', stages.importTogether, [
  stages.hash,
  stages.insertTogether,
]);
print(
  `  the same without keeping the original file${' '.repeat(17)}${((importMs - cpu(stages.keep) + cpu(stages.hash)) / (cpu(stages.hash) + cpu(stages.insertOneEach))).toFixed(1)}`,
);
ratio('import / reading alone', stages.importOneEach, [stages.parse]);
ratio('import / inserting alone', stages.importOneEach, [stages.insertOneEach]);
print(`  over HTTP / reading alone ${(http.serverCpuMs / cpu(stages.parse)).toFixed(1)}`);
print(`  over HTTP / inserting alone ${(http.serverCpuMs / cpu(stages.insertOneEach)).toFixed(1)}`);

function part(name: string, cpuMs: number): void {
  const share = Math.round((cpuMs / http.serverCpuMs) * 100);
  print(`  ${name.padEnd(28)} ${cpuMs.toFixed(3).padStart(7)} ms ${String(share).padStart(3)} %`);
}

function ratio(name: string, of: Measured, to: readonly Measured[]): void {
  const { whole, least, greatest } = ratioOf(of, to);
  print(`  ${name.padEnd(58)} ${whole.toFixed(1)} (${least.toFixed(1)} to ${greatest.toFixed(1)})`);
}

function at(share: number): string {
  return (http.durationsMs[Math.floor(share * http.durationsMs.length)] ?? NaN).toFixed(1);
}

function print(line: string): void {
  process.stdout.write(`${line}\n`);
}
