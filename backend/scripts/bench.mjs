import { prepareDatabase, readAddress, serve } from './application.mjs';
import { fillLibrary } from './bench-library.mjs';
import { compareImport } from './bench-imports.mjs';
import { compareStages } from './bench-stages.mjs';
import { interleaved, median, quantile } from './bench-measure.mjs';
import { loopOver, RANKINGS, SQL } from './bench-rankings.mjs';
import { buildStale } from './builds.mjs';
import { readCredentials } from './credentials.mjs';
import { createDatabase, ensureMariadbInstalled, startMariadb } from './mariadb.mjs';
import { ensurePackages, refuseOldNode } from './packages.mjs';
import { endOrphans } from './orphans.mjs';
import { inLocal } from './paths.mjs';
import { freePort } from './ports.mjs';
import { peakMemory } from './processes.mjs';
import { recall } from './records.mjs';
import { say, step } from './steps.mjs';
import { closeAll, supervise } from './supervision.mjs';

const DATABASE = 'roothertz_bench';
const PARTS = 100_000;
const ROUNDS = 40;

await supervise(async () => {
  refuseOldNode();
  await ensureMariadbInstalled();
  await ensurePackages();
  await buildStale(['common', 'backend']);
  await endOrphans();
  const server = await startMariadb({
    name: 'mariadb-bench',
    preferredPort: 33326,
    exclusive: true,
    options: ['--local-infile=1'],
  });
  await createDatabase(server, DATABASE, { fresh: true });
  const environment = {
    JWT_SECRET: readCredentials().jwtSecret,
    ...process.env,
    ...server.environment(DATABASE),
  };
  await prepareDatabase(environment);
  const { createConnection } = await import('mysql2/promise');
  const connection = await createConnection({
    host: server.host,
    port: server.port,
    user: environment.DB_OWNER_USER,
    password: environment.DB_OWNER_PASSWORD,
    database: DATABASE,
  });
  const library = await step('Library', async (note) => {
    note(`filling with ${PARTS} op-amps`);
    return { ...(await fillLibrary(connection, PARTS)), outcome: 'filled' };
  });
  const address = readAddress({ PORT: String(await freePort(33_330)) });
  await serve(address, environment);
  const results = await measure(address, connection, library);
  const imports = await importInStep(connection, environment);
  await connection.end();
  const rankings = reportRankings(results, peakMemory(recall(`application-${address.port}`).pid));
  const stages = reportStages(await compareInStep(library.columns));
  const imported = reportImports(imports);
  await closeAll();
  say(JSON.stringify({ ...rankings, ...stages, ...imported }));
  return 0;
});

async function measure({ url }, connection, { libraryId, columns }) {
  const ask = await session(url);
  await connection.query('SET profiling = 1');
  return step('Measuring', async (note) => {
    note(`${ROUNDS} rounds`);
    const times = await interleaved(ROUNDS, {
      resistive: () => ask(RANKINGS.resistive),
      reactive: () => ask(RANKINGS.reactive),
      sql: () => ownTime(connection, SQL, [libraryId]),
      loop: () => loopOver(columns),
    });
    return { ...times, outcome: 'done' };
  });
}

/** Another server imports, so that its memory is its own. */
async function importInStep(connection, environment) {
  const address = readAddress({ PORT: String(await freePort(33_340)) });
  await serve(address, { ...environment, IMPORT_DIR: inLocal('bench-imports') });
  const account = { email: 'librarian@tarnfield.example', password: 'quiet-bench-2026' };
  return step('Importing', async (note) => {
    note('a list of resistors, and the same rows with LOAD DATA');
    const times = await compareImport(connection, address.url, account);
    const peakMiB = peakMemory(recall(`application-${address.port}`).pid);
    return { ...times, peakMiB, outcome: 'done' };
  });
}

/** Signs in as the demo engineer; answers a function that ranks over HTTP. */
async function session(url) {
  const post = (path, body, headers) =>
    fetch(url + path, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', Origin: url, ...headers },
      body: JSON.stringify(body),
    });
  const credentials = { email: 'engineer@tarnfield.example', password: 'quiet-bench-2026' };
  const [cookie] = (await post('/api/auth/sign-in', credentials)).headers.getSetCookie();
  return async (ranking) => {
    const response = await post('/api/rankings/op-amps', ranking, { Cookie: cookie.split(';')[0] });
    const { items } = await response.json();
    if (response.status !== 200 || items.length !== ranking.limit)
      throw new Error(`the ranking answered ${response.status} with ${items?.length} items`);
  };
}

/** The server's own time for a query, without the way to this process and back. */
async function ownTime(connection, sql, values) {
  await connection.query(sql, values);
  const [profiles] = await connection.query('SHOW PROFILES');
  return profiles.at(-1).Duration * 1000;
}

function compareInStep(columns) {
  return step('Whole stages', async (note) => {
    note('pruned and exhaustive');
    return { ...(await compareStages(columns)), outcome: 'done' };
  });
}

function reportRankings({ resistive, reactive, sql, loop }, serverPeakMiB) {
  const line = (name, times) =>
    say(`${name}: p50 ${median(times).toFixed(1)} ms, p95 ${quantile(times, 0.95).toFixed(1)} ms`);
  say(`\n${PARTS} op-amps, each with a gain–bandwidth product and an input capacitance of its own:`);
  line('a  POST /api/rankings/op-amps, resistive source', resistive);
  line('a  POST /api/rankings/op-amps, reactive source', reactive);
  line('b  MariaDB, resistive closed form, ORDER BY … LIMIT 50', sql);
  line('c  bare loop over typed arrays, resistive closed form', loop);
  say(
    'What bounds a: the sieve over all parts and the lower bound of each part’s noise, one pass each; only the parts\n' +
      'that can be on the page or in the quiet set are integrated over the band.\n',
  );
  const ratio = (over, under) => rounded(median(over) / median(under));
  return {
    rankingResistiveOverSql: ratio(resistive, sql),
    rankingReactiveOverSql: ratio(reactive, sql),
    rankingResistiveOverLoop: ratio(resistive, loop),
    serverPeakMiB,
  };
}

function reportImports({ rows, imported, loaded, peakMiB }) {
  say(`${rows} resistors from the upload over the check to the last row applied: ${imported.toFixed(0)} ms;`);
  say(`LOAD DATA LOCAL INFILE of the same rows into equal tables: ${loaded.toFixed(0)} ms.\n`);
  return { importOverLoadData: Number((imported / loaded).toFixed(3)), importServerPeakMiB: peakMiB };
}

function reportStages(compared) {
  const { evaluations, exhaustiveEvaluations, time, exhaustiveTime } = compared;
  say('\n300 op-amps × 4000 resistors, whole stages:');
  say(`pruned: ${evaluations} stages evaluated in ${time.toFixed(0)} ms`);
  say(`by price: ${compared.pricedEvaluations} evaluated in ${compared.pricedTime.toFixed(0)} ms`);
  say(`exhaustive: ${exhaustiveEvaluations} stages evaluated in ${exhaustiveTime.toFixed(0)} ms\n`);
  return {
    stagesEvaluationsOverExhaustive: rounded(evaluations / exhaustiveEvaluations),
    stagesTimeOverExhaustive: rounded(time / exhaustiveTime),
  };
}

function rounded(ratio) {
  return Number(ratio.toPrecision(3));
}
