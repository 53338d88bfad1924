const CHUNK = 2000;
const INPUT_TYPES = ['bipolar', 'jfet', 'cmos', 'zero-drift'];

/** Numbers from 0 to 1, the same in every run (a linear congruential generator). */
function sequence() {
  let state = 20;
  return () => (state = (state * 1_103_515_245 + 12_345) % 2 ** 31) / 2 ** 31;
}

/**
 * Fills the demo team's library with invented op-amps: every figure is spread evenly in its logarithm, whatever the
 * others are. Answers the library's id and the figures that the bare loop takes.
 */
export async function fillLibrary(connection, count) {
  const [[library]] = await connection.query('SELECT id FROM libraries WHERE team_id IS NOT NULL');
  await connection.query('DELETE FROM parts WHERE library_id = ?', [library.id]);
  const [[{ next }]] = await connection.query('SELECT COALESCE(MAX(id), 0) + 1 AS next FROM parts');
  const columns = makeColumns(count);
  for (let from = 0; from < count; from += CHUNK) {
    const rows = Array.from({ length: Math.min(CHUNK, count - from) }, (_, index) => from + index);
    await insertParts(
      connection,
      rows.map((row) => partRow(library.id, next + row, row)),
    );
    await insertOpAmps(
      connection,
      rows.map((row) => opAmpRow(columns, next + row, row)),
    );
  }
  await connection.query('UPDATE libraries SET revision = revision + 1 WHERE id = ?', [library.id]);
  await connection.query('ANALYZE TABLE parts, op_amps');
  return { libraryId: library.id, columns };
}

function makeColumns(count) {
  const random = sequence();
  const spread = (from, to) => Float64Array.from({ length: count }, () => from * (to / from) ** random());
  return {
    voltageNoise: spread(0.8e-9, 60e-9),
    voltageNoiseCorner: spread(0.1, 3000),
    currentNoise: spread(1e-16, 5e-12),
    currentNoiseCorner: spread(0.1, 1000),
    gainBandwidth: spread(1e5, 2e9),
    inputCapacitance: spread(1e-12, 30e-12),
  };
}

function partRow(libraryId, id, row) {
  const now = new Date();
  const number = `BN-${row}`;
  return [
    id,
    libraryId,
    'op-amp',
    'Vireo',
    number,
    `vireo|bn${row}`,
    '',
    'SOIC-8',
    'active',
    'approved',
    now,
    now,
  ];
}

function insertParts(connection, rows) {
  return connection.query(
    `INSERT INTO parts (id, library_id, kind, manufacturer, part_number, normalised_key, description, package,
      lifecycle, approval, created_at, updated_at) VALUES ?`,
    [rows],
  );
}

function opAmpRow(columns, id, row) {
  const figures = Object.values(columns).map((column) => column[row]);
  return [id, INPUT_TYPES[row % INPUT_TYPES.length], 1, ...figures, 1, 3, 36, '{}'];
}

function insertOpAmps(connection, rows) {
  return connection.query(
    `INSERT INTO op_amps (part_id, input_type, channels, voltage_noise, voltage_noise_corner, current_noise,
      current_noise_corner, gain_bandwidth, input_capacitance, minimum_stable_gain, supply_minimum, supply_maximum,
      origins) VALUES ?`,
    [rows],
  );
}
