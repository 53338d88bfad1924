import { createReadStream, openAsBlob } from 'node:fs';
import { rm, writeFile } from 'node:fs/promises';
import { setTimeout as delay } from 'node:timers/promises';
import { median } from './bench-measure.mjs';
import { inLocal } from './paths.mjs';

const ROWS = 100_000;
const ROUNDS = 3;
const PACKAGES = ['0402', '0603', '0805', '1206'];
const FIRST_ID = 100_000_000;
const HEADINGS =
  'manufacturer,part number,description,package,lifecycle,approval,technology,resistance [Ω],tolerance [%],' +
  'temperature coefficient [ppm/K],power rating [W],noise index [dB]';

/**
 * Imports a list of resistors over HTTP from the upload to the last row that is applied, and loads the same rows with
 * LOAD DATA LOCAL INFILE into tables that are equal to the library's; answers the medians in ms.
 */
export async function compareImport(connection, url, account) {
  const [list, parts, resistors] = ['list.csv', 'parts.tsv', 'resistors.tsv'].map((name) =>
    inLocal(`bench-${name}`),
  );
  const ask = await session(url, account);
  const times = { imported: [], loaded: [] };
  for (let round = 0; round < ROUNDS; round += 1) {
    const rows = makeRows(round);
    await writeFile(list, [HEADINGS, ...rows.map(toCsv), ''].join('\n'));
    await writeFile(parts, rows.map(toPartLine).join(''));
    await writeFile(resistors, rows.map(toResistorLine).join(''));
    await makeEqualTables(connection);
    times.loaded.push(await timed(() => load(connection, { parts, resistors })));
    times.imported.push(await timed(() => importList(ask, list)));
    await connection.query(`DELETE FROM parts WHERE manufacturer = 'Bench Passive'`);
  }
  await connection.query('DROP TABLE bench_resistors, bench_parts');
  for (const file of [list, parts, resistors]) await rm(file);
  return { rows: ROWS, imported: median(times.imported), loaded: median(times.loaded) };
}

/** Empty tables with the columns, indexes and foreign keys of the library's. */
async function makeEqualTables(connection) {
  await connection.query('DROP TABLE IF EXISTS bench_resistors, bench_parts');
  for (const name of ['parts', 'resistors']) {
    const [[{ 'Create Table': ddl }]] = await connection.query(`SHOW CREATE TABLE ${name}`);
    await connection.query(ddl.replace(/(TABLE|CONSTRAINT|REFERENCES) `(parts|resistors)/g, '$1 `bench_$2'));
  }
}

async function timed(action) {
  const began = performance.now();
  await action();
  return performance.now() - began;
}

function makeRows(round) {
  return Array.from({ length: ROWS }, (_, n) => ({
    id: FIRST_ID + n,
    number: `BP${round}-${n}`,
    description: `Chip resistor of reel ${n % 977}`,
    package: PACKAGES[n % PACKAGES.length],
    resistance: Number((10 ** (n % 7) * (1 + (n % 89) / 10)).toPrecision(3)),
    noiseIndex: -40 + (n % 300) / 10,
  }));
}

function toCsv({ number, description, package: packageName, resistance, noiseIndex }) {
  const cells = [
    description,
    packageName,
    'active',
    'approved',
    'thin-film',
    resistance,
    0.1,
    25,
    0.125,
    noiseIndex,
  ];
  return `Bench Passive,${number},${cells.join(',')}`;
}

function toPartLine({ id, number, description, package: packageName }) {
  const key = `benchpassive|${number.toLowerCase().replace('-', '')}`;
  const cells = [
    id,
    1,
    'resistor',
    'Bench Passive',
    number,
    key,
    description,
    packageName,
    'active',
    'approved',
    1,
  ];
  return `${[...cells, '2026-12-01 00:00:00.000', '2026-12-01 00:00:00.000', '\\N'].join('\t')}\n`;
}

function toResistorLine({ id, resistance, noiseIndex }) {
  return `${[id, 'thin-film', resistance, 0.001, 25e-6, 0.125, noiseIndex, '\\N', '{}'].join('\t')}\n`;
}

async function load(connection, files) {
  for (const [name, file] of Object.entries(files)) {
    await connection.query({
      sql: `LOAD DATA LOCAL INFILE '${name}' INTO TABLE bench_${name} CHARACTER SET utf8mb4`,
      infileStreamFactory: () => createReadStream(file),
    });
  }
}

async function importList(ask, list) {
  const form = new FormData();
  form.set('kind', 'resistors');
  form.set('file', await openAsBlob(list), 'bench.csv');
  const upload = await ask('POST', '/api/imports', form);
  const columns = upload.columns.map(({ proposed }) => {
    const { column, field, form: stated, unit, frequency, origin } = proposed;
    return { column, field, form: stated, unit, frequency, origin };
  });
  const place = `/api/imports/${upload.id}`;
  await ask('PUT', `${place}/mapping`, JSON.stringify({ columns }));
  const { counts } = await reached(ask, place, 'checked');
  if (counts.new !== ROWS) throw new Error(`the check found ${JSON.stringify(counts)}`);
  await ask('POST', `${place}/apply`);
  await reached(ask, place, 'applied');
}

async function reached(ask, place, state) {
  for (;;) {
    const answer = await ask('GET', place);
    if (answer.state === state) return answer;
    if (answer.progress === null) throw new Error(`the import is ${answer.state}: ${answer.failure}`);
    await delay(200);
  }
}

/** Signs in; answers a function that calls the API. */
async function session(url, account) {
  const json = { 'Content-Type': 'application/json', Origin: url };
  const signIn = await fetch(`${url}/api/auth/sign-in`, {
    method: 'POST',
    headers: json,
    body: JSON.stringify(account),
  });
  const [cookie] = signIn.headers.getSetCookie()[0].split(';');
  return async (method, path, body) => {
    const headers = { Cookie: cookie, Origin: url, ...(typeof body === 'string' && json) };
    const response = await fetch(url + path, { method, headers, body });
    const answer = await response.json();
    if (!response.ok) throw new Error(`${method} ${path} answered ${response.status}: ${answer.detail}`);
    return answer;
  };
}
