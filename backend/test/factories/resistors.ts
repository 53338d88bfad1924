import type { TestMember } from '../support/index.js';

let made = 0;

/** The body of a resistor that no other call makes. */
export function resistorBody(changes: Record<string, unknown> = {}) {
  return {
    manufacturer: 'Kestrel Passive',
    partNumber: `KR-${++made}`,
    resistor: { resistance: 4700 },
    ...changes,
  };
}

export async function createResistor(member: TestMember, changes: Record<string, unknown> = {}) {
  const { body } = await member.agent.post('/api/resistors').send(resistorBody(changes)).expect(201);
  return body as { id: string; version: number; partNumber: string };
}
