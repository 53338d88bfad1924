import type { ImportResponseDto } from '../../src/imports/dto/import-response.dto.js';
import type { ImportKind } from '../../src/imports/import-states.js';
import type { TestMember } from '../support/index.js';

/** Uploads a list and answers whatever the server says. */
export function sendList(member: TestMember, kind: ImportKind, list: string | Buffer, name = 'list.csv') {
  const content = typeof list === 'string' ? Buffer.from(list) : list;
  return member.agent.post('/api/imports').field('kind', kind).attach('file', content, name);
}

export async function uploadList(
  member: TestMember,
  kind: ImportKind,
  list: string | Buffer,
  name?: string,
): Promise<ImportResponseDto> {
  const { body } = await sendList(member, kind, list, name).expect(201);
  return body as ImportResponseDto;
}

/** The mapping that was proposed, as it is sent back. */
export function proposedMapping({ columns }: ImportResponseDto) {
  return columns.flatMap(({ proposed }) => {
    if (proposed === null) return [];
    const { column, field, form, unit, frequency, quantity, origin } = proposed;
    return [{ column, field, form, unit, frequency, quantity, origin }];
  });
}

/** Uploads a list and checks its rows with the proposed mapping. */
export async function checkedList(
  member: TestMember,
  kind: ImportKind,
  list: string | Buffer,
  wholeList?: { supplier?: string; currency?: string },
): Promise<ImportResponseDto> {
  const upload = await uploadList(member, kind, list);
  const columns = proposedMapping(upload);
  const { body } = await member.agent
    .put(`/api/imports/${upload.id}/mapping`)
    .send({ columns, wholeList })
    .expect(200);
  return ended(member, body as ImportResponseDto);
}

/** Waits until nobody is at work on the import. */
export async function ended(
  member: TestMember,
  { id }: Pick<ImportResponseDto, 'id'>,
): Promise<ImportResponseDto> {
  for (;;) {
    const { body } = await member.agent.get(`/api/imports/${id}`).expect(200);
    if (body.progress === null) return body as ImportResponseDto;
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
}

export async function applyList(
  member: TestMember,
  kind: ImportKind,
  list: string | Buffer,
  wholeList?: { supplier?: string; currency?: string },
): Promise<ImportResponseDto> {
  const checked = await checkedList(member, kind, list, wholeList);
  await member.agent.post(`/api/imports/${checked.id}/apply`).expect(202);
  return ended(member, checked);
}

export async function rowsOf(member: TestMember, { id }: Pick<ImportResponseDto, 'id'>, query = '') {
  const { body } = await member.agent.get(`/api/imports/${id}/rows?limit=1000&${query}`).expect(200);
  return body.items;
}
