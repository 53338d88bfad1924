import iconv from 'iconv-lite';
import { readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { checkedList, ended, proposedMapping, rowsOf, sendList, uploadList } from './factories/imports.js';
import { createTeam, signInMember, startTestApp, type TestApp, type TestMember } from './support/index.js';
import { Import } from '../src/imports/entities/import.entity.js';

const DIRECTORY = join(tmpdir(), `roothertz-imports-hostile-${process.pid}`);
const HEADINGS = ['Hersteller', 'Bestellnummer', 'Widerstand [kΩ]', 'Beschreibung'];
const ROW = ['Müller & Söhne', 'R-1', '4,7', '±0,1 %'];

const ENCODINGS = [
  ['utf-8', false],
  ['utf-8', true],
  ['utf-16le', true],
  ['utf-16le', false],
  ['utf-16be', true],
  ['utf-16be', false],
  ['windows-1252', false],
] as const;
const DELIMITERS = [
  ['comma', ','],
  ['semicolon', ';'],
  ['tab', '\t'],
  ['pipe', '|'],
] as const;
const COMBINATIONS = ENCODINGS.flatMap(([encoding, mark]) =>
  DELIMITERS.map(([name, character]) => [encoding, mark, name, character] as const),
);

const HEAD = 'maker,mpn,value,remark\n';
const GOOD = 'Vireo,GOOD-1,100,\n';
const ZIP = Buffer.concat([
  Buffer.from([0x50, 0x4b, 0x03, 0x04, 20, 0, 0, 0, 8, 0]),
  Buffer.alloc(500, 0x9c),
]);

describe('hostile lists', () => {
  let app: TestApp;
  let librarian: TestMember;

  beforeAll(async () => {
    app = await startTestApp({ IMPORT_DIR: DIRECTORY });
  });
  beforeEach(async () => {
    librarian = await signInMember(app, await createTeam(app), ['librarian']);
  });
  afterAll(async () => {
    await app.close();
    await rm(DIRECTORY, { recursive: true });
  });

  it.each(COMBINATIONS)('are read in %s (mark: %s) with %s', async (encoding, mark, delimiter, character) => {
    const quoted = (cells: string[]) =>
      cells.map((cell) => (cell.includes(character) ? `"${cell}"` : cell)).join(character);
    const headings =
      encoding === 'windows-1252' ? HEADINGS.map((text) => text.replace('Ω', 'Ohm')) : HEADINGS;
    const text = `${quoted(headings)}\r\n${quoted(ROW)}\r\n`;
    const list = iconv.encode(text, encoding, { addBOM: mark });
    const upload = await uploadList(librarian, 'resistors', list);
    expect(upload.dialect).toEqual({
      encoding,
      byteOrderMark: mark,
      delimiter,
      decimalMark: 'comma',
      headerLine: 1,
    });
    const columns = proposedMapping(upload);
    const { body } = await librarian.agent
      .put(`/api/imports/${upload.id}/mapping`)
      .send({ columns })
      .expect(200);
    expect(body.counts).toMatchObject({ new: 1, refused: 0 });
    expect(await rowsOf(librarian, upload)).toMatchObject([
      { line: 2, manufacturer: ROW[0], partNumber: 'R-1' },
    ]);
  });

  it.each<[string, Buffer | string, number]>([
    ['nothing', '', 422],
    ['only white space', ' \n\n \t \n', 422],
    ['only headings', HEAD, 422],
    ['a ZIP archive', ZIP, 422],
    ['a picture', Buffer.from('89504e470d0a1a0a0000000d49484452000001f4000001f408060000', 'hex'), 422],
    ['a cell of 10 MB', `${HEAD}${GOOD}Vireo,BIG-1,100,"${'x'.repeat(10 * 2 ** 20)}"\n`, 422],
    ['a quotation mark that is left open', `${HEAD}${GOOD}Vireo,"OPEN,100,\n${GOOD}`, 422],
    ['1 001 columns', `${'a,'.repeat(1000)}b\n${'1,'.repeat(1000)}2\n`, 422],
    ['more than 500 000 rows', `${HEAD}${'a,b,1,\n'.repeat(500_001)}`, 413],
  ])(
    'are refused for %s, and nothing of them is kept',
    async (_, list, status) => {
      const { body } = await sendList(librarian, 'resistors', list).expect(status);
      expect(body.detail).toMatch(/\w/);
      expect(await app.dataSource.getRepository(Import).countBy({ teamId: librarian.caller.teamId })).toBe(0);
      expect(await keptFiles()).toEqual([]);
    },
    120_000,
  );

  const keptFiles = async () => {
    const known = (await app.dataSource.getRepository(Import).find()).map(({ storedName }) => storedName);
    return (await readdir(DIRECTORY)).filter((name) => !known.includes(name));
  };

  it.each<[string, string, object]>([
    ['ragged rows', `${HEAD}Vireo,A-1\nVireo,A-2,100,x,y,z\nVireo,A-3,100\n`, { new: 2, refused: 1 }],
    ['NUL bytes', `${HEAD}Vireo,N\u0000-1,100,\nVireo,N-2,1\u000000,\n${GOOD}`, { new: 1, refused: 2 }],
    [
      'formulas',
      `${HEAD}=1+1,"=HYPERLINK(""http://x"",""y"")",100,@SUM(A1)\n${GOOD}`,
      { new: 2, refused: 0 },
    ],
    [
      'mixed line ends',
      'maker,mpn,value\r\nVireo,M-1,1\nVireo,M-2,2\r\nVireo,M-3,3\rVireo,M-4,4',
      { new: 4, refused: 0 },
    ],
    ['duplicate headings', 'maker,mpn,value,value,maker\nVireo,D-1,100,200,Hallam\n', { new: 1, refused: 0 }],
    ['text from right to left', `${HEAD}ורטקס,נגד-1,100,‏מקביל‏\n`, { new: 1, refused: 0 }],
    ['emoji', `${HEAD}Vireo 🎛️,👩‍🔧-1,100,𝛑\n`, { new: 1, refused: 0 }],
    ['quoted line breaks', `${HEAD}Vireo,"Q-1",100,"two\nlines"\nVireo,Q-2,100,\n`, { new: 2, refused: 0 }],
    [
      'quotes within cells',
      `${HEAD}Vireo,T-1,100,5" reel\nVireo,T-2,100,"say ""so"""\n`,
      { new: 2, refused: 0 },
    ],
    [
      '1 000 columns',
      `maker,mpn,value,${'x,'.repeat(996)}y\nVireo,W-1,100,${'1,'.repeat(996)}2\n`,
      { new: 1, refused: 0 },
    ],
    [
      'numbers past all doubles',
      `${HEAD}Vireo,B-1,1e999,\nVireo,B-2,-1e-999,\nVireo,B-3,${'9'.repeat(190)},\n`,
      { new: 0, refused: 3 },
    ],
    [
      'parts twice',
      `${HEAD}${GOOD}VIREO,good1,100,\nVireo Inc.,GOOD-1,101,\n`,
      { new: 1, unchanged: 1, refused: 1 },
    ],
    ['the same row twice', `${HEAD}${GOOD}${GOOD}`, { new: 1, unchanged: 1, refused: 0 }],
    ['halves of characters', `${HEAD}Vireo,\uFFFF-1,100,\n${GOOD}`, { new: 2, refused: 0 }],
    ['query language', `${HEAD}"'; DROP TABLE parts; --",S-1,100,"\\' OR 1=1"\n`, { new: 1, refused: 0 }],
  ])('with %s are checked row by row, and applied whole', async (_, list, counts) => {
    const checked = await checkedList(librarian, 'resistors', list);
    expect(checked.counts).toMatchObject(counts);
    await librarian.agent.get(`/api/imports/${checked.id}/refused.csv`).expect(200);
    await librarian.agent.post(`/api/imports/${checked.id}/apply`).expect(202);
    expect(await ended(librarian, checked)).toMatchObject({ state: 'applied' });
    const { new: added } = checked.counts!;
    const { body } = await librarian.agent.get('/api/resistors?library=team').expect(200);
    expect(body.total).toBe(added);
    expect((await librarian.agent.get('/api/resistors.csv').expect(200)).text.split('\n')).toHaveLength(
      added + 2,
    );
  });

  it('in UTF-16 with halves of characters are read with a sign in place of each half', async () => {
    const list = Buffer.from(`\uFEFF${HEAD}Vireo,\ud800-1,100,\n${GOOD}`, 'utf16le');
    const checked = await checkedList(librarian, 'resistors', list);
    expect((await rowsOf(librarian, checked))[0].partNumber).toBe('\uFFFD-1');
  });

  it('name the line on which a row begins', async () => {
    const list = 'A list\n\nmaker,mpn,value,remark\n\nVireo,L-1,1,"a\nb"\nVireo,L-2,x,\n\n\nVireo,L-3,3,\n';
    const checked = await checkedList(librarian, 'resistors', list);
    expect((await rowsOf(librarian, checked)).map(({ line }: { line: number }) => line)).toEqual([5, 7, 10]);
  });

  it('of more than 100 MB are refused as they come in', async () => {
    const { body } = await sendList(librarian, 'resistors', Buffer.alloc(100 * 2 ** 20 + 1, 'a')).expect(413);
    expect(body).toMatchObject({ code: 'import.too-large', detail: expect.stringContaining('100 MB') });
    expect(await keptFiles()).toEqual([]);
  });

  it.each([
    ['no file', (member: TestMember) => member.agent.post('/api/imports').field('kind', 'resistors')],
    [
      'no kind',
      (member: TestMember) => member.agent.post('/api/imports').attach('file', Buffer.from(HEAD + GOOD), 'x'),
    ],
    [
      'two files',
      (member: TestMember) =>
        sendList(member, 'resistors', HEAD + GOOD).attach('file', Buffer.from(HEAD), 'y.csv'),
    ],
    [
      'another field',
      (member: TestMember) => sendList(member, 'resistors', HEAD + GOOD).field('colour', 'red'),
    ],
    ['JSON', (member: TestMember) => member.agent.post('/api/imports').send({ kind: 'resistors' })],
    [
      'a form that is cut off',
      (member: TestMember) =>
        member.agent
          .post('/api/imports')
          .set('Content-Type', 'multipart/form-data; boundary=x')
          .send('--x\r\nContent-Disposition: form-data; name="file"; filename="a"\r\n\r\nabc'),
    ],
    [
      'a form without a boundary',
      (member: TestMember) =>
        member.agent.post('/api/imports').set('Content-Type', 'multipart/form-data').send('abc'),
    ],
  ])('are refused with %s', async (_, send) => {
    const { body } = await send(librarian).expect(400);
    expect(body.code).toBe('request.invalid');
    expect(await keptFiles()).toEqual([]);
  });
});
