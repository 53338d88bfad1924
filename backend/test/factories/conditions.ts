import type { TestMember } from '../support/index.js';

/** The shortest body that can be saved. */
export function conditionsBody(changes: Record<string, unknown> = {}) {
  return {
    name: 'River geophone',
    conditions: {
      source: { resistance: 375 },
      band: { lower: 1, upper: 400 },
      stage: { topology: 'non-inverting', gain: 100, gainResistance: 10 },
    },
    ...changes,
  };
}

export async function saveConditions(member: TestMember, changes: Record<string, unknown> = {}) {
  const { body } = await member.agent.post('/api/conditions').send(conditionsBody(changes)).expect(201);
  return body as { id: string; version: number; name: string };
}
