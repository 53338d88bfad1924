import type { TestMember } from '../support/index.js';

/** Restricts all own parts of a kind and answers the id by which that can be taken back. */
export async function changedStandings(member: TestMember, kind: string): Promise<string> {
  const outcome = await member.agent.get(`/api/${kind}/standings?toApproval=restricted`).expect(200);
  const change = { libraryRevision: outcome.body.libraryRevision, approval: 'restricted' };
  const { body } = await member.agent.post(`/api/${kind}/standings`).send(change).expect(200);
  return body.id;
}
