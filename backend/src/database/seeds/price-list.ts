import { addDays, checkOffer, type OfferTerms } from '@roothertz/common/prices';
import { type ListedRow, readRows } from './part-list.js';

const PRICE_AT = /^price at (\d+)$/;

/** An offer of a list in data/, its days made dates. */
export interface ListedOffer {
  manufacturer: string;
  partNumber: string;
  supplier: string;
  terms: OfferTerms;
  opened: string;
  confirmed: string;
  closed: string | null;
}

/** The offers of a list in data/, each checked as on the day it was opened; the first fault ends it. */
export function readPriceList(path: string, today: string): ListedOffer[] {
  return readRows(path).map((row) => {
    const offer = toOffer(row.record, today);
    const [error] = checkOffer(offer.terms, offer.opened);
    if (error) throw new Error(`data/${path}, line ${row.info.lines}, ${error.field}: ${error.message}`);
    return offer;
  });
}

function toOffer(record: ListedRow['record'], today: string): ListedOffer {
  const day = (heading: string) => (record[heading] === '' ? null : addDays(today, Number(record[heading])));
  const opened = day('opened [days]') ?? today;
  return {
    manufacturer: record.manufacturer,
    partNumber: record['part number'],
    supplier: record.supplier,
    terms: { ...toTerms(record), validFrom: opened, validUntil: day('valid until [days]') },
    opened,
    confirmed: day('confirmed [days]') ?? opened,
    closed: day('closed [days]'),
  };
}

function toTerms(record: ListedRow['record']): Omit<OfferTerms, 'validFrom' | 'validUntil'> {
  const count = (heading: string) => (record[heading] === '' ? null : Number(record[heading]));
  const breaks = Object.entries(record).flatMap(([heading, unitPrice]) => {
    const quantity = PRICE_AT.exec(heading)?.[1];
    return quantity === undefined || unitPrice === ''
      ? []
      : [{ minimumQuantity: Number(quantity), unitPrice }];
  });
  return {
    supplierNumber: record["supplier's number"],
    currency: record.currency,
    breaks,
    minimumOrderQuantity: count('minimum order quantity') ?? 1,
    orderMultiple: count('order multiple') ?? 1,
    leadTimeDays: count('lead time [days]'),
    stock: count('stock'),
  };
}
