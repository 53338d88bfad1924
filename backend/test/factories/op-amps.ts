import type { TestMember } from '../support/index.js';

let made = 0;

/** The body of a part that no other call makes. */
export function opAmpBody(changes: Record<string, unknown> = {}) {
  return {
    manufacturer: 'Kestrel Analog',
    partNumber: `KA-${++made}`,
    amplifier: { voltageNoise: 1.1e-9 },
    ...changes,
  };
}

export async function createOpAmp(member: TestMember, changes: Record<string, unknown> = {}) {
  const { body } = await member.agent.post('/api/op-amps').send(opAmpBody(changes)).expect(201);
  return body as { id: string; version: number; partNumber: string };
}
