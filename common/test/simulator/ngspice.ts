import { execFile } from 'node:child_process';
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';

const run = promisify(execFile);
const PROGRAM = process.env.NGSPICE_PATH ?? 'ngspice';

/** A noise analysis at frequencies in equal factors from `from` to `to`. */
export interface Sweep {
  from: number;
  to: number;
  perDecade: number;
}

export interface NoiseJob {
  circuit: string;
  signal: string;
  sweep: Sweep;
}

/** Vectors by name, densities in V²/Hz and A²/Hz. */
export type Vectors = ReadonlyMap<string, Float64Array>;

/** Runs noise analyses from node `out`, all of them in one process of the simulator. */
export async function simulateNoise(jobs: readonly NoiseJob[]): Promise<Vectors[]> {
  const folder = await mkdtemp(join(tmpdir(), 'roothertz-ngspice-'));
  try {
    await Promise.all(jobs.map(({ circuit }, n) => writeFile(join(folder, `${n}.cir`), circuit)));
    await writeFile(join(folder, 'all.sp'), controlScript(jobs));
    const { stdout, stderr } = await runSimulator(folder);
    return await Promise.all(
      jobs.map((_, n) =>
        readFile(join(folder, `${n}.raw`)).then(readVectors, () => {
          throw new Error(`ngspice has no answer for circuit ${n}:\n${stdout.slice(-2000)}\n${stderr}`);
        }),
      ),
    );
  } finally {
    await rm(folder, { recursive: true });
  }
}

async function runSimulator(folder: string) {
  try {
    return await run(PROGRAM, ['-n', '-b', 'all.sp'], { cwd: folder, maxBuffer: 2 ** 28 });
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'ENOENT') throw error;
    throw new Error(
      `the circuit simulator ${PROGRAM} is missing: \`npm test -- common\` installs it, or install Debian’s package ngspice, or name it with NGSPICE_PATH`,
      { cause: error },
    );
  }
}

/** A little beyond the last frequency, which rounding must not cut off. */
const BEYOND = 1.0001;

function controlScript(jobs: readonly NoiseJob[]): string {
  const commands = jobs.flatMap(({ signal, sweep: { from, to, perDecade } }, n) => [
    `source ${n}.cir`,
    `noise v(out) ${signal} dec ${perDecade} ${from} ${to * BEYOND} 1`,
    'setplot previous',
    `write ${n}.raw`,
    'destroy all',
    'remcirc',
  ]);
  return [
    '* all',
    '.control',
    'set filetype=binary',
    'set sqrnoise',
    ...commands,
    'quit',
    '.endc',
    '.end',
    '',
  ].join('\n');
}

/** The simulator's raw file: a header in text, then the points, each with all variables as doubles. */
function readVectors(file: Buffer): Vectors {
  const mark = 'Binary:\n';
  const start = file.indexOf(mark) + mark.length;
  const header = file.toString('latin1', 0, start);
  const count = (label: string) => Number(new RegExp(`${label}: *(\\d+)`).exec(header)![1]);
  const points = count('No\\. Points');
  const names = [...header.split('Variables:\n')[1].matchAll(/^\t\d+\t(\S+)\t/gm)].map(([, name]) => name);
  return new Map(
    names.map((name, k) => [
      name,
      Float64Array.from({ length: points }, (_, p) => file.readDoubleLE(start + 8 * (p * names.length + k))),
    ]),
  );
}
