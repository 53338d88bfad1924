import { OP_AMP_CATALOGUE, RESISTOR_CATALOGUE } from '@roothertz/common/parts';
import { IsNull } from 'typeorm';
import { createOpAmp } from './factories/op-amps.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';
import { readPartList, readSeriesList } from '../src/database/seeds/part-list.js';
import { seed } from '../src/database/seeds/seed.js';
import { Library } from '../src/library/entities/library.entity.js';
import { Part } from '../src/library/entities/part.entity.js';
import { LibraryService } from '../src/library/library.service.js';

describe('the library', () => {
  let app: TestApp;
  let libraries: LibraryService;
  let librarian: TestMember;
  let stranger: TestMember;

  beforeAll(async () => {
    app = await startTestApp();
    await app.dataSource.transaction((manager) => seed(manager, true));
    libraries = app.nest.get(LibraryService);
    librarian = await signInMember(app, await createTeam(app), ['librarian']);
    stranger = await signInMember(app, await createTeam(app), ['librarian']);
  });
  afterAll(() => app.close());

  const ownLibrary = async ({ caller }: TestMember) =>
    (await libraries.readableLibraries(caller)).find(({ library }) => library === 'team');

  it('is seeded with every part of the lists, figure by figure', async () => {
    const [curated, own] = await app.dataSource.manager.find(Library, { order: { id: 'ASC' } });
    const expected = [
      [curated, 'curated/op-amps.csv'],
      [own, 'demo/tarnfield-op-amps.csv'],
    ] as const;
    for (const [{ id }, path] of expected) {
      const list = readPartList(OP_AMP_CATALOGUE, path);
      const { columns, manufacturers, partNumbers } = await libraries.loadOpAmpColumns(id);
      expect(columns.count).toBe(list.length);
      list.forEach(({ manufacturer, partNumber, amplifier, origins, lifecycle }, row) => {
        expect([manufacturers[row], partNumbers[row]]).toEqual([manufacturer, partNumber]);
        expect(columns.lifecycle[row]).toBe(lifecycle);
        expect(columns.inputType[row]).toBe(amplifier.inputType);
        expect(columns.parameters.voltageNoise[row]).toBe(amplifier.voltageNoise);
        expect(columns.parameters.currentNoise[row]).toBe(amplifier.currentNoise ?? NaN);
        expect(columns.origins.currentNoise[row]).toBe(origins.currentNoise ?? 'typical');
      });
    }
  });

  it('is seeded with every resistor of the series and of the team’s list', async () => {
    const libraryOf = (name: 'curated' | 'team', id: number) => ({ id, library: name, revision: 1 });
    const [curated, own] = await app.dataSource.manager.find(Library, { order: { id: 'ASC' } });
    const expected = [
      [libraryOf('curated', curated.id), readSeriesList('curated/resistor-series.csv')],
      [libraryOf('team', own.id), readPartList(RESISTOR_CATALOGUE, 'demo/tarnfield-resistors.csv')],
    ] as const;
    expect(expected[0][1].length).toBeGreaterThanOrEqual(4000);
    for (const [library, list] of expected) {
      const listed = await libraries.loadResistors(library);
      expect(listed).toEqual(
        list.map(({ description, resistor, ...part }) => ({
          ...part,
          ...resistor,
          id: expect.any(Number),
          library: library.library,
          searchText: `${part.manufacturer} ${part.partNumber} ${description}`.toLowerCase(),
        })),
      );
    }
  });

  it('gets the curated resistors that an older one lacks, under a new revision', async () => {
    const curated = { teamId: IsNull() };
    const { id: libraryId, revision } = await app.dataSource.manager.findOneByOrFail(Library, curated);
    await app.dataSource.manager.delete(Part, { kind: 'resistor', libraryId });
    const report = await app.dataSource.transaction((manager) => seed(manager, true));
    expect(report).toBe('Seeded: curated resistors');
    expect(await app.dataSource.manager.findOneByOrFail(Library, curated)).toMatchObject({
      revision: revision + 1,
    });
  });

  it('is not seeded again where it is filled', async () => {
    const report = await app.dataSource.transaction((manager) => seed(manager, true));
    expect(report).toBe('Nothing to seed');
  });

  it('shows a team the curated parts and its own', async () => {
    const created = await createOpAmp(librarian);
    const readable = await libraries.readableLibraries(librarian.caller);
    expect(readable.map(({ library }) => library)).toEqual(['curated', 'team']);
    expect(readable[1].id).toBe(await libraries.editableLibrary(librarian.caller));
    const { ids } = await libraries.loadOpAmpColumns(readable[1].id);
    expect(ids).toEqual(Uint32Array.of(Number(created.id)));
  });

  it('makes a team’s own library once, however many ask for it at once', async () => {
    const { caller } = await signInMember(app, await createTeam(app), ['librarian']);
    const ids = await Promise.all([1, 2, 3, 4].map(() => libraries.editableLibrary(caller)));
    expect(new Set(ids).size).toBe(1);
  });

  it('gives columns in which unknown figures are not numbers and texts are searched in lower case', async () => {
    const { id } = await createOpAmp(librarian, {
      manufacturer: 'Übersee Mikro',
      partNumber: 'ÜM-1',
      description: 'Two Channels',
      amplifier: { voltageNoise: 1e-9, gainBandwidth: 95580.31070271993, voltageNoiseCorner: null },
      origins: { voltageNoise: 'maximum' },
    });
    const { ids, columns } = await libraries.loadOpAmpColumns((await ownLibrary(librarian))!.id);
    const row = ids.indexOf(Number(id));
    expect(columns.searchText[row]).toBe('übersee mikro üm-1 two channels');
    expect(columns.parameters.gainBandwidth[row]).toBe(95580.31070271993);
    expect(columns.parameters.voltageNoiseCorner[row]).toBeNaN();
    expect(columns.parameters.currentNoiseCorner[row]).toBe(0);
    expect(columns.origins.voltageNoise[row]).toBe('maximum');
    expect(columns.origins.currentNoise[row]).toBe('typical');
  });

  it('has a new revision after each of many writes at once', async () => {
    await createOpAmp(librarian);
    const before = (await ownLibrary(librarian))!.revision;
    await Promise.all(Array.from({ length: 8 }, () => createOpAmp(librarian)));
    expect((await ownLibrary(librarian))!.revision).toBe(before + 8);
  });

  it('goes with its team', async () => {
    const { id } = await createOpAmp(stranger);
    await app.dataSource.query('DELETE FROM teams WHERE id = ?', [stranger.caller.teamId]);
    const [{ parts }] = await app.dataSource.query(
      'SELECT COUNT(*) AS parts FROM op_amps WHERE part_id = ?',
      [id],
    );
    expect(Number(parts)).toBe(0);
  });
});
