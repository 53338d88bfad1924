import { nameKey } from '../shared/text/name-key.js';

interface Keyed {
  partId: number;
  supplierId: number;
  supplierNumber: string;
}

/** The same for offers of one supplier for one part under one supplier's number. */
export function offerKey({ partId, supplierId, supplierNumber }: Keyed): string {
  return `${partId} ${supplierId} ${nameKey(supplierNumber)}`;
}
