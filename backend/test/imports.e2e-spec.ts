import { rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import {
  applyList,
  checkedList,
  ended,
  proposedMapping,
  rowsOf,
  sendList,
  uploadList,
} from './factories/imports.js';
import type { Response } from 'superagent';
import { saveConditions } from './factories/conditions.js';
import { createOpAmp } from './factories/op-amps.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';
import { Part } from '../src/library/entities/part.entity.js';
import { ImportPortion } from '../src/imports/entities/import-portion.entity.js';

const DIRECTORY = join(tmpdir(), `roothertz-imports-test-${process.pid}`);
const GERMAN = [
  'Bauteilliste Einkauf;;;;;;;',
  '',
  'Hersteller;Bestellnr.;en @1kHz (nV/√Hz);en @10Hz (nV/√Hz);in typ;GBP [MHz];Gehäuse;Lagerort',
  'Vireo;VR-1108D;1,15;1,31;1,4;60;SOIC-8;B4-12',
  'Hallam;HT-2041;0,95;1,20;1,9;45;SOIC-8;B4-13',
  'Lune & Quist;LQ-77B;2,1;2,9;0,45;18;SOT-23-5;',
  'Kestner;KM-31;n.a.;;0,4;8..12;SOIC-8;',
  'VIREO;VR 1108 D;1,15;1,31;1,4;61;SOIC-8;B4-12',
  'Tarn Micro;TN-1;0,1;0,12;0,3;20;SOIC-8;',
  '',
].join('\r\n');

describe('imports', () => {
  let app: TestApp;
  let librarian: TestMember;
  let engineer: TestMember;

  beforeAll(async () => {
    app = await startTestApp({ IMPORT_DIR: DIRECTORY });
  });
  beforeEach(async () => {
    const team = await createTeam(app);
    librarian = await signInMember(app, team, ['librarian']);
    engineer = await signInMember(app, team, ['engineer']);
  });
  afterAll(async () => {
    await app.close();
    await rm(DIRECTORY, { recursive: true });
  });

  const opAmps = async (member = librarian) =>
    (await member.agent.get('/api/op-amps?library=team&limit=1000').expect(200)).body.items;
  const csvOf = async (path: string) =>
    (await librarian.agent.get(path).buffer(true).parse(asBuffer).expect(200)).body as Buffer;

  it('say how a list is written and what its columns are', async () => {
    const body = await uploadList(librarian, 'op-amps', GERMAN, 'Liste Ü.csv');
    expect(body).toMatchObject({
      kind: 'op-amps',
      state: 'uploaded',
      fileName: 'Liste Ü.csv',
      rowCount: 6,
      dialect: {
        encoding: 'utf-8',
        byteOrderMark: false,
        delimiter: 'semicolon',
        decimalMark: 'comma',
        headerLine: 3,
      },
      counts: null,
      progress: null,
      sameFile: null,
      rememberedMapping: null,
      createdBy: { name: expect.any(String) },
    });
    expect(
      body.columns.map(({ proposed }) => proposed && [proposed.field, proposed.form, proposed.unit]),
    ).toEqual([
      ['manufacturer', 'value', null],
      ['partNumber', 'value', null],
      ['voltageNoise', 'spot', 'nV/√Hz'],
      ['voltageNoise', 'spot', 'nV/√Hz'],
      ['currentNoise', 'value', 'pA/√Hz'],
      ['gainBandwidth', 'value', 'MHz'],
      ['package', 'value', null],
      null,
    ]);
    expect(body.columns[4].proposed).toMatchObject({ unitAssumed: true, confidence: 1 });
    expect(body.columns[0].samples).toEqual(['Vireo', 'Hallam', 'Lune & Quist', 'Kestner', 'VIREO']);
  });

  it('give every row its verdict before anything changes, and then write all accepted rows', async () => {
    const checked = await checkedList(librarian, 'op-amps', GERMAN);
    expect(checked).toMatchObject({
      state: 'checked',
      counts: { new: 3, changed: 0, unchanged: 0, doubtful: 1, refused: 2 },
    });
    expect(await opAmps()).toEqual([]);
    const refused = await rowsOf(librarian, checked, 'state=refused');
    expect(refused).toMatchObject([
      {
        line: 7,
        errors: [
          { column: 'GBP [MHz]', value: '8..12', why: expect.stringContaining('this is a range') },
          { column: 'en @1kHz (nV/√Hz)', value: 'n.a.', expected: expect.stringContaining('above 0') },
        ],
      },
      {
        line: 8,
        errors: [
          { column: 'Bestellnr.', value: 'VR 1108 D', why: 'stands on line 4 too, with other values' },
        ],
      },
    ]);
    expect(await rowsOf(librarian, checked, 'state=doubtful')).toMatchObject([
      { line: 9, partNumber: 'TN-1', doubts: [{ code: 'implausibly-quiet' }] },
    ]);
    const { revision } = (await libraryOf())!;
    const { body } = await librarian.agent.post(`/api/imports/${checked.id}/apply`).expect(202);
    expect(['waiting', 'applying', 'applied']).toContain(body.state);
    expect(await ended(engineer, checked)).toMatchObject({
      state: 'applied',
      appliedBy: { name: expect.any(String) },
    });
    expect((await opAmps()).map(({ partNumber }: { partNumber: string }) => partNumber).sort()).toEqual([
      'HT-2041',
      'LQ-77B',
      'TN-1',
      'VR-1108D',
    ]);
    expect((await libraryOf())!.revision).toBe(revision + 1);
    const [lune] = (await opAmps()).filter(
      ({ manufacturer }: { manufacturer: string }) => manufacturer === 'Lune & Quist',
    );
    expect(lune).toMatchObject({
      package: 'SOT-23-5',
      amplifier: { currentNoise: 0.45e-12, gainBandwidth: 18e6, voltageNoise: expect.closeTo(2.0907e-9, 12) },
    });
  });

  const libraryOf = async () => {
    const [library] = await app.dataSource.query('SELECT id, revision FROM libraries WHERE team_id = ?', [
      librarian.caller.teamId,
    ]);
    return library as { id: number; revision: number } | undefined;
  };

  it('show changes field by field, and undo them unless a part was edited since', async () => {
    const changed = await createOpAmp(librarian, {
      partNumber: 'C-1',
      description: 'Before',
      amplifier: { voltageNoise: 1e-9 },
    });
    const edited = await createOpAmp(librarian, { partNumber: 'E-1', amplifier: { voltageNoise: 2e-9 } });
    await saveConditions(librarian, { name: 'River geophone', partIds: [edited.id] });
    const before = (await librarian.agent.get(`/api/op-amps/${changed.id}`)).body;
    const list =
      'maker,mpn,en [nV/√Hz],remark\nKestrel Analog,C-1,1.5,After\nKestrel-Analog Inc.,E1,3,\nKestrel Analog,N-1,4,\nKestrel Analog,N-2,4,\n';
    const done = await applyList(librarian, 'op-amps', list);
    expect(done).toMatchObject({ state: 'applied', counts: { new: 2, changed: 2, refused: 0 } });
    expect(await rowsOf(librarian, done, 'state=changed')).toMatchObject([
      {
        line: 2,
        partNumber: 'C-1',
        changes: [
          { field: 'description', old: 'Before', new: 'After' },
          { field: 'amplifier.voltageNoise', old: 1e-9, new: 1.5e-9 },
        ],
      },
      {
        line: 3,
        partNumber: 'E-1',
        doubts: [{ code: 'in-use', message: 'used in the saved conditions “River geophone”' }],
      },
    ]);
    expect(await rowsOf(librarian, done, 'state=new')).toMatchObject([
      {
        partNumber: 'N-1',
        changes: expect.arrayContaining([
          { field: 'manufacturer', old: null, new: 'Kestrel Analog' },
          { field: 'amplifier.voltageNoise', old: null, new: 4e-9 },
        ]),
      },
      { partNumber: 'N-2' },
    ]);
    const { body: now } = await librarian.agent.get(`/api/op-amps/${edited.id}`).expect(200);
    expect(now).toMatchObject({
      manufacturer: 'Kestrel Analog',
      amplifier: { voltageNoise: 3e-9 },
      version: 2,
    });
    await librarian.agent
      .patch(`/api/op-amps/${edited.id}`)
      .send({ version: 2, package: 'DIP-8' })
      .expect(200);
    const chosen = (await opAmps()).find(({ partNumber }: { partNumber: string }) => partNumber === 'N-2');
    await saveConditions(librarian, { name: 'Hydrophone', partIds: [chosen.id] });
    await librarian.agent.post(`/api/imports/${done.id}/undo`).expect(202);
    expect(await ended(librarian, done)).toMatchObject({
      state: 'undone',
      keptCount: 2,
      undoneBy: expect.any(Object),
    });
    expect(await rowsOf(librarian, done, 'state=kept')).toMatchObject([
      { line: 3, partNumber: 'E-1', kept: true },
      { line: 5, partNumber: 'N-2', kept: true },
    ]);
    const after = (await librarian.agent.get(`/api/op-amps/${changed.id}`)).body;
    expect(after).toEqual({ ...before, version: 3, updatedAt: expect.any(String) });
    expect((await opAmps()).map(({ partNumber }: { partNumber: string }) => partNumber).sort()).toEqual([
      'C-1',
      'E-1',
      'N-2',
    ]);
    await librarian.agent.post(`/api/imports/${done.id}/undo`).expect(409);
    await librarian.agent.post(`/api/imports/${done.id}/apply`).expect(409);
  });

  it.each([
    '?',
    '?delimiter=semicolon&decimalMark=comma',
    '?delimiter=tab',
    '?delimiter=pipe&decimalMark=comma',
  ])('read an exported library back as unchanged: %s', async (query) => {
    await createOpAmp(librarian, {
      manufacturer: '=HYPERLINK("x")',
      partNumber: '+1',
      description: '@home; "quoted", a|b\u202e עברית 🎛️',
      lifecycle: 'last-time-buy',
      approval: 'not-approved',
      amplifier: {
        inputType: 'zero-drift',
        voltageNoise: 1.234567890123456e-9,
        voltageNoiseCorner: null,
        supplyMinimum: 2.7,
      },
      origins: { voltageNoise: 'measured' },
    });
    await createOpAmp(librarian, {
      partNumber: "'-7",
      amplifier: { voltageNoise: 1.234e-9, gainBandwidth: 12345678 },
    });
    const list = await csvOf(`/api/op-amps.csv${query}`);
    expect(list.toString()).toContain("'=HYPERLINK");
    expect(list.toString()).toContain("'+1");
    const checked = await checkedList(librarian, 'op-amps', list);
    expect(checked.dialect).toMatchObject({ encoding: 'utf-8', byteOrderMark: true });
    expect(checked).toMatchObject({ counts: { new: 0, changed: 0, unchanged: 2, doubtful: 0, refused: 0 } });
  });

  it('give the refused rows back with the reasons, to be mended and sent again', async () => {
    const checked = await checkedList(librarian, 'op-amps', GERMAN);
    const list = (await csvOf(`/api/imports/${checked.id}/refused.csv`)).toString();
    const [heading, first, second] = list.split('\r\n');
    expect(heading).toMatch(
      /^Hersteller;Bestellnr\.;.*;Lagerort;line of the file;why refused;what was needed$/,
    );
    expect(first).toMatch(/^Kestner;KM-31;n\.a\.;;0,4;8\.\.12;SOIC-8;;7;/);
    expect(second).toContain('stands on line 4 too');
    const mended = list.replace('n.a.;', '3,3;').replace('8..12', '12');
    expect((await uploadList(librarian, 'op-amps', mended)).rememberedMapping).toEqual(
      proposedMapping(checked),
    );
    expect((await checkedList(librarian, 'op-amps', mended)).counts).toMatchObject({ new: 2, refused: 0 });
  });

  it('recognise the very same file, and remember what the columns of a list with the same headings are', async () => {
    const first = await checkedList(librarian, 'op-amps', GERMAN);
    const again = await uploadList(engineerWhoMayEdit(), 'op-amps', GERMAN);
    expect(again.sameFile).toMatchObject({ id: first.id, state: 'checked' });
    expect(again.rememberedMapping).toEqual(proposedMapping(first));
    const other = await uploadList(
      librarian,
      'op-amps',
      GERMAN.replace('Lagerort', 'lagerORT').replace('60', '61'),
    );
    expect(other.sameFile).toBeNull();
    expect(other.rememberedMapping).toEqual(proposedMapping(first));
  });
  const engineerWhoMayEdit = () => librarian;

  it('take the dialect that a member states in place of the detected one', async () => {
    const list = 'maker;mpn;en\nVireo;V-1;1.234\nVireo;V-2;2.345\n';
    const upload = await uploadList(librarian, 'op-amps', list);
    expect(upload.dialect).toMatchObject({ decimalMark: 'point', headerLine: 1 });
    const put = (body: object) => librarian.agent.put(`/api/imports/${upload.id}/mapping`).send(body);
    const { body: asComma } = await put({ decimalMark: 'comma', columns: proposedMapping(upload) }).expect(
      200,
    );
    expect(asComma.dialect.decimalMark).toBe('comma');
    const values = await rowsOf(librarian, upload);
    expect(values).toHaveLength(2);
    const [portion] = await app.dataSource
      .getRepository(ImportPortion)
      .findBy({ importId: Number(upload.id) });
    expect(portion.rows[0].content).toContain(1.234e-6);
    const { body: moved } = await put({ headerLine: 2 }).expect(200);
    expect(moved).toMatchObject({
      state: 'uploaded',
      rowCount: 1,
      counts: null,
      columns: [{ heading: 'Vireo' }, {}, {}],
    });
    const { body: split } = await put({ delimiter: 'comma', headerLine: 1 }).expect(200);
    expect(split.columns).toHaveLength(1);
    const { body: wide } = await put({ encoding: 'utf-16le' });
    expect(wide.code ?? wide.state).toMatch(/import\.unreadable|uploaded/);
  });

  it.each([
    ['columns[0].column', [{ column: -1, field: 'manufacturer' }]],
    ['columns[0].form', [{ column: 0, field: 'manufacturer', form: 'guess' }]],
    ['columns[0].colour', [{ column: 0, field: 'manufacturer', colour: 1 }]],
    ['columns', []],
  ])('refuse a malformed mapping at %s', async (field, columns) => {
    const { id } = await uploadList(librarian, 'op-amps', GERMAN);
    const { body } = await librarian.agent.put(`/api/imports/${id}/mapping`).send({ columns }).expect(400);
    expect(body.errors.map((error: { field: string }) => error.field)).toContain(field);
  });

  it('refuse a mapping that can’t be', async () => {
    const upload = await uploadList(librarian, 'op-amps', GERMAN);
    const columns = [...proposedMapping(upload), { column: 7, field: 'colour' }];
    const { body } = await librarian.agent
      .put(`/api/imports/${upload.id}/mapping`)
      .send({ columns })
      .expect(422);
    expect(body).toMatchObject({ code: 'import.mapping', errors: [{ field: 'columns.7.field' }] });
    await librarian.agent.post(`/api/imports/${upload.id}/apply`).expect(409);
  });

  it('are another team’s business to nobody', async () => {
    const { id } = await checkedList(librarian, 'op-amps', GERMAN);
    const stranger = await signInMember(app, await createTeam(app), ['admin', 'librarian']);
    for (const path of ['', '/rows', '/refused.csv'])
      await stranger.agent.get(`/api/imports/${id}${path}`).expect(404);
    for (const path of ['apply', 'cancel', 'undo'])
      await stranger.agent.post(`/api/imports/${id}/${path}`).expect(404);
    await stranger.agent.put(`/api/imports/${id}/mapping`).send({}).expect(404);
    expect((await stranger.agent.get('/api/imports').expect(200)).body).toEqual({ items: [], total: 0 });
    expect((await stranger.agent.get('/api/op-amps.csv').expect(200)).text).not.toContain('Vireo');
  });

  it('are read by every member and changed by librarians alone', async () => {
    const { id } = await checkedList(librarian, 'op-amps', GERMAN);
    const { body } = await engineer.agent.get('/api/imports').expect(200);
    expect(body).toMatchObject({ total: 1, items: [{ id, fileName: 'list.csv' }] });
    expect(body.items[0]).not.toHaveProperty('columns');
    await sendList(engineer, 'op-amps', GERMAN).expect(403);
    await engineer.agent.post(`/api/imports/${id}/apply`).expect(403);
  });

  it('wait for each other, and refuse what another one has changed since the check', async () => {
    const row = (number: string, noise: number) => `Vireo,${number},${noise}\n`;
    const many = (letter: string) =>
      Array.from({ length: 2500 }, (_, index) => row(`${letter}-${index}`, 2)).join('');
    const head = 'maker,mpn,en [nV/√Hz]\n';
    const [one, other, third] = [
      await checkedList(librarian, 'op-amps', head + many('A')),
      await checkedList(librarian, 'op-amps', head + many('B')),
      await checkedList(librarian, 'op-amps', head + row('Z-1', 1) + row('A-7', 3)),
    ];
    await Promise.all(
      [one, other].map(({ id }) => librarian.agent.post(`/api/imports/${id}/apply`).expect(202)),
    );
    expect(await ended(librarian, one)).toMatchObject({ state: 'applied' });
    expect(await ended(librarian, other)).toMatchObject({ state: 'applied' });
    expect(await countParts()).toBe(5000);
    await librarian.agent.post(`/api/imports/${third.id}/apply`).expect(202);
    expect(await ended(librarian, third)).toMatchObject({
      state: 'outdated',
      failure: expect.stringContaining('A-7 of line 3'),
    });
    expect(await countParts()).toBe(5000);
    const columns = proposedMapping(third);
    const { body } = await librarian.agent
      .put(`/api/imports/${third.id}/mapping`)
      .send({ columns })
      .expect(200);
    expect(body.counts).toMatchObject({ new: 1, changed: 1 });
  });

  const countParts = async () => {
    const { id } = (await libraryOf())!;
    return app.dataSource.getRepository(Part).countBy({ libraryId: id });
  };

  it('can be cancelled, which leaves the library as before', async () => {
    const list = `maker,mpn,en\n${Array.from({ length: 6000 }, (_, index) => `Vireo,X-${index},2\n`).join('')}`;
    const checked = await checkedList(librarian, 'op-amps', list);
    const { revision } = (await libraryOf())!;
    const holder = app.dataSource.createQueryRunner();
    const { id } = (await libraryOf())!;
    await holder.query(`SELECT GET_LOCK(CONCAT(LEFT(DATABASE(), 40), ' library ', ?), 5)`, [id]);
    await librarian.agent.post(`/api/imports/${checked.id}/apply`).expect(202);
    const { body } = await librarian.agent.post(`/api/imports/${checked.id}/cancel`).expect(202);
    expect(body.state).toBe('waiting');
    expect(await ended(librarian, checked)).toMatchObject({ state: 'cancelled', failure: null });
    await holder.query(`SELECT RELEASE_LOCK(CONCAT(LEFT(DATABASE(), 40), ' library ', ?))`, [id]);
    await holder.release();
    expect(await countParts()).toBe(0);
    expect((await libraryOf())!.revision).toBe(revision);
    await librarian.agent.post(`/api/imports/${checked.id}/apply`).expect(202);
    expect(await ended(librarian, checked)).toMatchObject({ state: 'applied' });
    expect(await countParts()).toBe(6000);
  });
});

function asBuffer(response: Response, done: (error: Error | null, body: Buffer) => void): void {
  const pieces: Buffer[] = [];
  (response as unknown as NodeJS.ReadableStream).on('data', (piece: Buffer) => pieces.push(piece));
  (response as unknown as NodeJS.ReadableStream).on('end', () => done(null, Buffer.concat(pieces)));
}
