/** From this many pieces on, one of them costs so much. */
export interface PriceBreak {
  minimumQuantity: number;
  /** decimal number with a full stop, up to four decimals */
  unitPrice: string;
}

/** What a supplier asks for a part. */
export interface Offer {
  supplier: string;
  /** the number under which the supplier sells the part */
  supplierNumber: string;
  /** ISO 4217 */
  currency: string;
  /** in ascending order of quantity */
  breaks: readonly PriceBreak[];
  minimumOrderQuantity: number;
  /** only whole multiples of it are sold */
  orderMultiple: number;
  /** null = unknown */
  leadTimeDays: number | null;
  /** null = unknown */
  stock: number | null;
  /** first day */
  validFrom: string;
  /** last day; null = until further notice */
  validUntil: string | null;
  /** the moment at which somebody of the team last saw that it holds */
  confirmedAt: string;
}

/** What of an offer a change can change. */
export type OfferTerms = Omit<Offer, 'supplier' | 'confirmedAt'>;

/** The terms of a new offer before what is stated of it. */
export function newOfferTerms(today: string): Omit<OfferTerms, 'currency' | 'breaks'> {
  return {
    supplierNumber: '',
    minimumOrderQuantity: 1,
    orderMultiple: 1,
    leadTimeDays: null,
    stock: null,
    validFrom: today,
    validUntil: null,
  };
}

/** Whether an offer can be accepted on a day. */
export function isValidOn({ validFrom, validUntil }: Offer, day: string): boolean {
  return validFrom <= day && (validUntil === null || day <= validUntil);
}
