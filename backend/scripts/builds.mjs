import { mkdirSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { inLocal, inRoot } from './paths.mjs';
import { run } from './processes.mjs';
import { isStale, leftovers } from './staleness.mjs';
import { step, timed } from './steps.mjs';

const SHARED_SOURCES = ['tsconfig.base.json', 'package-lock.json'];
const stampOf = (name) => inLocal('built', name);

/** In the order in which they need each other. Vite empties its own output. */
const BUILDS = [
  {
    name: 'fakes',
    folder: join('backend', 'fakes'),
    workspace: 'backend',
    script: 'build:fakes',
    sources: ['payments', 'tsconfig.json'],
  },
  { name: 'common', sources: ['src', 'package.json', 'tsconfig.json', 'tsconfig.build.json'] },
  {
    name: 'backend',
    sources: ['src', 'package.json', 'tsconfig.json', 'tsconfig.build.json'],
    needs: 'common',
  },
  {
    name: 'frontend',
    sources: ['src', 'public', 'index.html', 'package.json', 'tsconfig.json', 'vite.config.ts'],
    needs: 'common',
    emptiesItsOutput: true,
  },
];

const isBuildStale = ({ name, folder = name, sources, needs }) =>
  isStale({
    stamp: stampOf(name),
    output: inRoot(folder, 'dist'),
    sources: [
      ...sources.map((source) => inRoot(folder, source)),
      ...SHARED_SOURCES.map((source) => inRoot(source)),
      ...(needs ? [stampOf(needs)] : []),
    ],
  });

/**
 * Builds for use, whatever NODE_ENV says here. The stamp carries the time at which the build began: what is edited
 * meanwhile counts as newer.
 */
async function build({ name, folder = name, workspace = name, script = 'build', emptiesItsOutput }) {
  const began = Date.now();
  const env = { ...process.env, NODE_ENV: 'production' };
  await run('npm', ['run', script, '-w', workspace], { cwd: inRoot(), env });
  if (!emptiesItsOutput) leftovers(inRoot(folder, 'dist'), began).forEach((path) => rmSync(path));
  mkdirSync(inLocal('built'), { recursive: true });
  writeFileSync(stampOf(name), '');
  utimesSync(stampOf(name), began / 1000, began / 1000);
}

/** Builds those of the named packages whose sources are newer than their last build. */
export async function buildStale(names) {
  for (const one of BUILDS.filter(({ name }) => names.includes(name))) {
    await step(`Build of ${one.name}`, async (note) => {
      if (!isBuildStale(one)) return 'fresh';
      note('stale, building');
      return timed(() => build(one));
    });
  }
}
