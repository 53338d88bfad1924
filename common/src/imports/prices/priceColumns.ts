import { type ListColumns, namesOf } from '../listColumns.js';
import { checkPriceMapping } from './checkPriceMapping.js';
import { PRICE_FIELDS } from './priceFields.js';
import { priceColumnProposer, proposePriceField } from './priceHeadings.js';

/** The columns of a supplier's price list. */
export const PRICE_COLUMNS: ListColumns = {
  proposer: priceColumnProposer,
  proposeField: proposePriceField,
  names: namesOf(PRICE_FIELDS),
  check: checkPriceMapping,
};
