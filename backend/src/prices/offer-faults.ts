import { DomainError } from '../shared/errors/domain-error.js';

/** Why offers can't be saved; the first that applies says how the request fails. */
const DETAILS = {
  'part.not-found': 'There is no such part in your libraries.',
  'supplier.not-found': 'Your team has no such supplier.',
  'offer.not-found': 'Your team has no such offer.',
  'offer.stale': 'Somebody has changed this offer meanwhile: load it again.',
  'offer.duplicate': 'There is an offer of this supplier for this part already.',
  'offer.invalid': 'Some values of the offer can’t be kept.',
} as const;

export interface Fault {
  code: keyof typeof DETAILS;
  field: string;
  message: string;
}

/** Throws what is wrong, all of it named by field; passes where nothing is. */
export function refuseFaults(faults: readonly Fault[]): void {
  const codes = Object.keys(DETAILS) as Fault['code'][];
  const code = codes.find((candidate) => faults.some((fault) => fault.code === candidate));
  if (code === undefined) return;
  const errors = faults.map(({ field, message }) => ({ field, message }));
  throw new DomainError(code, DETAILS[code], { errors });
}
