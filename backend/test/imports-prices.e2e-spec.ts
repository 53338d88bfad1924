import { readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { addDays, dayOf } from '@roothertz/common/prices';
import { AuditEntry } from '../src/audit/entities/audit-entry.entity.js';
import { Offer } from '../src/prices/entities/offer.entity.js';
import {
  applyList,
  checkedList,
  ended,
  proposedMapping,
  rowsOf,
  sendList,
  uploadList,
} from './factories/imports.js';
import { createOffer, createSupplier } from './factories/offers.js';
import { createOpAmp } from './factories/op-amps.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';

const DIRECTORY = join(tmpdir(), `roothertz-imports-prices-test-${process.pid}`);
const TODAY = dayOf(new Date());
const LARKHOLM = { supplier: 'Larkholm Components', currency: 'EUR' };

describe('imports of prices', () => {
  let app: TestApp;
  let purchasing: TestMember;
  let librarian: TestMember;
  let partId: string;

  beforeAll(async () => {
    app = await startTestApp({ IMPORT_DIR: DIRECTORY });
  });
  beforeEach(async () => {
    const team = await createTeam(app);
    purchasing = await signInMember(app, team, ['purchasing']);
    librarian = await signInMember(app, team, ['librarian']);
    partId = (await createOpAmp(librarian, { manufacturer: 'Vireo Corp.', partNumber: 'VR-1108D' })).id;
  });
  afterAll(async () => {
    await app.close();
    await rm(DIRECTORY, { recursive: true });
  });

  const fixture = (name: string) => readFile(new URL(`fixtures/${name}`, import.meta.url));
  const offersOf = async (id: string) =>
    (await librarian.agent.get(`/api/parts/${id}/offers`).expect(200)).body;
  const undone = async (id: string) => {
    await purchasing.agent.post(`/api/imports/${id}/undo`).expect(202);
    return ended(purchasing, { id });
  };
  const audited = (objectKind: 'import' | 'offer' | 'supplier') =>
    app.dataSource.getRepository(AuditEntry).find({
      where: { teamId: purchasing.caller.teamId, objectKind },
      order: { id: 'ASC' },
    });

  it('recognise a German quotation in the wide form, with a price for each quantity', async () => {
    const upload = await uploadList(purchasing, 'prices', await fixture('quotation-wide-german.csv'));
    expect(upload.dialect).toMatchObject({
      encoding: 'windows-1252',
      delimiter: 'semicolon',
      decimalMark: 'comma',
      headerLine: 3,
    });
    expect(
      upload.columns.map(({ proposed }) => proposed && [proposed.field, proposed.quantity, proposed.unit]),
    ).toEqual([
      ['supplierNumber', null, null],
      ['manufacturer', null, null],
      ['partNumber', null, null],
      ['unitPrice', 1, 'EUR'],
      ['unitPrice', 10, 'EUR'],
      ['unitPrice', 100, 'EUR'],
      ['unitPrice', 1000, 'EUR'],
      ['minimumOrderQuantity', null, null],
      ['orderMultiple', null, null],
      ['leadTimeDays', null, 'weeks'],
      ['stock', null, null],
      ['validUntil', null, null],
      null,
    ]);
  });

  it('open offers for known parts, add their supplier, and take all back', async () => {
    const list = await fixture('quotation-wide-german.csv');
    const checked = await checkedList(purchasing, 'prices', list, { supplier: 'Brauwerk Bauteile' });
    expect(checked).toMatchObject({
      state: 'checked',
      counts: { new: 1, changed: 0, unchanged: 0, doubtful: 0, refused: 3 },
      wholeList: { supplier: 'Brauwerk Bauteile', currency: null },
    });
    expect(await rowsOf(purchasing, checked, 'state=new')).toMatchObject([
      {
        line: 4,
        partNumber: 'VR 1108 D',
        supplier: 'Brauwerk Bauteile',
        changes: expect.arrayContaining([{ field: 'breaks.100', old: null, new: '3.1000' }]),
        doubts: [{ code: 'new-supplier' }],
      },
    ]);
    expect(await rowsOf(purchasing, checked, 'state=refused')).toMatchObject([
      { line: 5, errors: [{ column: 'Typ', value: 'HT-2041', why: 'your libraries have no such part' }] },
      {
        line: 6,
        errors: [{ column: 'ab 100 [EUR]', value: '1.234,56', why: expect.stringContaining('in groups') }],
      },
      { line: 7, errors: [{ column: 'gültig bis', value: '31.12.2019' }] },
    ]);
    expect(await offersOf(partId)).toEqual({ current: [], history: [] });

    await purchasing.agent.post(`/api/imports/${checked.id}/apply`).expect(202);
    expect(await ended(purchasing, checked)).toMatchObject({ state: 'applied', keptCount: 0 });
    expect(await offersOf(partId)).toMatchObject({
      current: [
        {
          supplier: { name: 'Brauwerk Bauteile' },
          supplierNumber: 'BB-77120',
          currency: 'EUR',
          breaks: [
            { minimumQuantity: 1, unitPrice: '4.2000' },
            { minimumQuantity: 10, unitPrice: '3.9000' },
            { minimumQuantity: 100, unitPrice: '3.1000' },
          ],
          minimumOrderQuantity: 1,
          orderMultiple: 5,
          leadTimeDays: 42,
          stock: 1250,
          validFrom: TODAY,
          validUntil: '2199-12-31',
          confirmedBy: { id: String(purchasing.caller.userId) },
        },
      ],
      history: [],
    });
    expect((await audited('import')).map(({ action, userId, to }) => ({ action, userId, to }))).toEqual([
      {
        action: 'import.applied',
        userId: purchasing.caller.userId,
        to: { kind: 'prices', counts: checked.counts },
      },
    ]);
    expect((await audited('supplier')).map(({ action }) => action)).toEqual(['supplier.added']);

    expect(await undone(checked.id)).toMatchObject({ state: 'undone', keptCount: 0 });
    const { current, history } = await offersOf(partId);
    expect(current).toEqual([]);
    expect(history).toMatchObject([{ supplierNumber: 'BB-77120', closedAt: expect.any(String) }]);
    expect((await audited('import')).at(-1)).toMatchObject({ action: 'import.undone' });
    expect((await audited('offer')).map(({ action }) => action)).toEqual(['offer.opened', 'offer.closed']);
  });

  it('read the long form, close what a changed price replaces, and bring it back exactly', async () => {
    const { id: supplierId } = await createSupplier(purchasing, LARKHOLM.supplier);
    const old = await createOffer(
      purchasing,
      { partId, supplierId },
      { supplierNumber: 'LK-9', stock: 7, leadTimeDays: 14, validFrom: addDays(TODAY, -40) },
    );
    const [before] = (await offersOf(partId)).current;
    const list = await fixture('quotation-long.csv');
    const applied = await applyList(purchasing, 'prices', list);
    expect(applied).toMatchObject({ counts: { new: 0, changed: 2, unchanged: 1, doubtful: 0, refused: 2 } });
    expect(await rowsOf(purchasing, applied)).toMatchObject([
      { line: 2, state: 'changed', changes: [{ field: 'leadTimeDays', old: 14, new: 21 }] },
      { line: 3, state: 'refused', errors: [{ why: 'line 5 of the same offer is refused' }] },
      { line: 4, state: 'changed', changes: [{ field: 'breaks.100', old: '3.1000', new: '2.9500' }] },
      { line: 5, state: 'refused', errors: [{ column: 'unit price', value: 'on request' }] },
      { line: 6, state: 'unchanged', doubts: [{ code: 'repeated', message: 'the same as line 4' }] },
    ]);
    const { current, history } = await offersOf(partId);
    expect(current).toMatchObject([
      {
        version: 2,
        stock: 7,
        leadTimeDays: 21,
        supplierNumber: 'LK-9',
        breaks: [{}, { unitPrice: '2.9500' }],
      },
    ]);
    expect(history).toMatchObject([{ id: old.id, version: 1, closedAt: expect.any(String) }]);

    expect(await undone(applied.id)).toMatchObject({ state: 'undone', keptCount: 0 });
    const after = await offersOf(partId);
    const [restored] = after.current;
    expect(after.current).toHaveLength(1);
    expect(restored).toEqual({
      ...before,
      id: expect.any(String),
      version: 3,
      openedAt: expect.any(String),
    });
    expect(after.history).toHaveLength(2);
  });

  it('leave at an undoing what was changed or confirmed since', async () => {
    const second = await createOpAmp(librarian, { manufacturer: 'Vireo', partNumber: 'VR-2' });
    const list = 'maker,mpn,1+,100+\nVireo,VR-1108D,4.2,3.1\nVireo,VR-2,5,4\n';
    const applied = await applyList(purchasing, 'prices', list, LARKHOLM);
    const [{ id }] = (await offersOf(second.id)).current;
    await purchasing.agent
      .post('/api/offers/confirm')
      .send({ ids: [id] })
      .expect(200);
    expect(await undone(applied.id)).toMatchObject({ state: 'undone', keptCount: 1 });
    expect(await rowsOf(purchasing, applied, 'state=kept')).toMatchObject([{ line: 3, kept: true }]);
    expect((await offersOf(partId)).current).toEqual([]);
    expect((await offersOf(second.id)).current).toMatchObject([{ id }]);
  });

  it('are read again as unchanged, and doubt a price that is ten times the one before', async () => {
    const list = (price: string) =>
      `maker,mpn,supplier,currency,10\nVireo,VR1108D,Larkholm Components,EUR,${price}\n`;
    await applyList(purchasing, 'prices', list('4.20'));
    expect((await checkedList(purchasing, 'prices', list('4.2'))).counts).toMatchObject({ unchanged: 1 });
    const slipped = await checkedList(purchasing, 'prices', list('42'));
    expect(slipped.counts).toMatchObject({ doubtful: 1 });
    expect(await rowsOf(purchasing, slipped)).toMatchObject([{ doubts: [{ code: 'price-slip' }] }]);
  });

  it('write nothing where an offer has changed since the check', async () => {
    const second = await createOpAmp(librarian, { manufacturer: 'Vireo', partNumber: 'VR-2' });
    const rows = (price: string) => `maker,mpn,1\nVireo,VR-2,${price}\nVireo,VR-1108D,${price}\n`;
    await applyList(purchasing, 'prices', rows('4'), LARKHOLM);
    const checked = await checkedList(purchasing, 'prices', rows('5'), LARKHOLM);
    const [{ id, version }] = (await offersOf(partId)).current;
    await purchasing.agent.patch(`/api/offers/${id}`).send({ version, stock: 3 }).expect(200);
    await purchasing.agent.post(`/api/imports/${checked.id}/apply`).expect(202);
    expect(await ended(purchasing, checked)).toMatchObject({
      state: 'outdated',
      failure: expect.stringContaining('line 3'),
    });
    expect((await offersOf(second.id)).current).toMatchObject([{ breaks: [{ unitPrice: '4.0000' }] }]);
    expect(await app.dataSource.getRepository(Offer).countBy({ teamId: purchasing.caller.teamId })).toBe(3);
    const { body } = await purchasing.agent
      .put(`/api/imports/${checked.id}/mapping`)
      .send({ columns: proposedMapping(checked) })
      .expect(200);
    expect(body.counts).toMatchObject({ changed: 2 });
  });

  it('have at most 50 000 rows', async () => {
    const list = (rows: number) => `maker,mpn,1\n${'Vireo,VR-1108D,4\n'.repeat(rows)}`;
    const { body } = await sendList(purchasing, 'prices', list(50_001)).expect(413);
    expect(body).toMatchObject({ code: 'import.too-large', detail: expect.stringContaining('50 000 rows') });
  });

  it('are for purchasing alone, as lists of parts are for librarians', async () => {
    const list = 'maker,mpn,1\nVireo,VR-1108D,4\n';
    const { id } = await checkedList(purchasing, 'prices', list, LARKHOLM);
    await sendList(librarian, 'prices', list).expect(403);
    await sendList(purchasing, 'op-amps', list).expect(403);
    for (const path of ['apply', 'cancel', 'undo'])
      await librarian.agent.post(`/api/imports/${id}/${path}`).expect(403);
    await librarian.agent.put(`/api/imports/${id}/mapping`).send({}).expect(403);
    await librarian.agent.delete(`/api/imports/${id}`).expect(403);
    await librarian.agent.get(`/api/imports/${id}`).expect(200);
    const parts = await checkedList(librarian, 'op-amps', 'maker,mpn,en\nVireo,V-1,3\n');
    await purchasing.agent.post(`/api/imports/${parts.id}/apply`).expect(403);
    const stranger = await signInMember(app, await createTeam(app), ['purchasing']);
    await stranger.agent.post(`/api/imports/${id}/apply`).expect(404);
  });

  it.each([
    ['wholeList.supplier', 422, {}],
    ['wholeList.supplier', 400, { wholeList: { supplier: '\u0000' } }],
    ['wholeList.currency', 400, { wholeList: { ...LARKHOLM, currency: 'Euro' } }],
    ['columns[2].quantity', 400, { wholeList: LARKHOLM, quantity: -1 }],
    ['columns.2.quantity', 422, { wholeList: LARKHOLM, quantity: null }],
  ])(
    'refuse what can’t be said of a list at %s with %d',
    async (field, status, { wholeList, ...change }: object & { wholeList?: object }) => {
      const upload = await uploadList(purchasing, 'prices', 'maker,mpn,1\nVireo,VR-1108D,4\n');
      const columns = proposedMapping(upload).map((column) =>
        column.column === 2 ? { ...column, ...change } : column,
      );
      const { body } = await purchasing.agent
        .put(`/api/imports/${upload.id}/mapping`)
        .send({ columns, wholeList })
        .expect(status);
      expect(body.errors.map((error: { field: string }) => error.field)).toContain(field);
    },
  );
});
