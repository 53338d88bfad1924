import type { TestMember } from '../support/index.js';

let made = 0;

export async function createSupplier(member: TestMember, name = `Supplier ${++made}`) {
  const { body } = await member.agent.post('/api/suppliers').send({ name }).expect(201);
  return body as { id: string; name: string };
}

interface Offered {
  partId: string;
  supplierId: string;
}

/** The body of an offer that can be kept. */
export function offerBody({ partId, supplierId }: Offered, changes: Record<string, unknown> = {}) {
  return {
    partId,
    supplierId,
    currency: 'EUR',
    breaks: [
      { minimumQuantity: 1, unitPrice: '4.20' },
      { minimumQuantity: 100, unitPrice: '3.10' },
    ],
    ...changes,
  };
}

export async function createOffer(
  member: TestMember,
  offered: Offered,
  changes: Record<string, unknown> = {},
) {
  const { body } = await member.agent.post('/api/offers').send(offerBody(offered, changes)).expect(201);
  return body as { id: string; version: number; part: { id: string } };
}
