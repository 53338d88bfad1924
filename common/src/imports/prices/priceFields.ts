import { PART_FIELDS, type TextField } from '../../parts/index.js';
import { OFFER_FIELDS, SUPPLIER_NAME, SUPPLIER_NUMBER } from '../../prices/index.js';

/** How the cells of a field of a price list are read. */
export type PriceFieldKind = 'text' | 'currency' | 'count' | 'lead-time' | 'price' | 'day';

/** A field of a supplier's price list. */
export interface PriceField {
  key: string;
  label: string;
  kind: PriceFieldKind;
  /** What its cells may hold, in words. */
  expected: string;
  /** Other names that lists give its column, in English, German and French. */
  synonyms: readonly string[];
}

const [MANUFACTURER, PART_NUMBER] = PART_FIELDS;

/** The fields of a price list whose cells are texts. */
export const PRICE_TEXTS: Readonly<Record<string, TextField>> = {
  manufacturer: MANUFACTURER,
  partNumber: PART_NUMBER,
  supplier: { ...SUPPLIER_NAME, label: 'supplier' },
  supplierNumber: SUPPLIER_NUMBER,
};

/** Everything that a column of a price list can be; “order code” is the supplier's number there. */
export const PRICE_FIELDS: readonly PriceField[] = [
  {
    key: 'manufacturer',
    label: MANUFACTURER.label,
    kind: 'text',
    expected: 'a text of at most 120 characters on one line',
    synonyms: MANUFACTURER.synonyms,
  },
  {
    key: 'partNumber',
    label: PART_NUMBER.label,
    kind: 'text',
    expected: 'a text of at most 120 characters on one line',
    synonyms: [
      ...[
        'part',
        'part no',
        'mpn',
        'type',
        'manufacturer part number',
        'manufacturer part',
        'mfr part number',
      ],
      ...['mfr part no', 'mfr part', 'mfr pn', 'mfg part number', 'mfg part no', 'mfg part', 'mfg pn'],
      ...[
        'Typ',
        'Herstellernummer',
        'Hersteller-Nr.',
        'Herstellerteilenummer',
        'Hersteller-Teilenr.',
        'Hersteller-Artikelnummer',
        'Hersteller-Artikelnr.',
        'Teilenummer',
      ],
      ...['référence', 'référence fabricant', 'réf. fabricant'],
    ],
  },
  {
    key: 'supplier',
    label: 'supplier',
    kind: 'text',
    expected: 'a text of at most 120 characters on one line',
    synonyms: ['vendor', 'distributor', 'seller', 'Lieferant', 'Anbieter', 'Distributor', 'fournisseur'],
  },
  {
    key: 'supplierNumber',
    label: SUPPLIER_NUMBER.label,
    kind: 'text',
    expected: 'a text of at most 60 characters on one line',
    synonyms: [
      ...[
        'supplier number',
        'supplier part number',
        'vendor part number',
        'sku',
        'order code',
        'order number',
      ],
      ...['Bestellnr.', 'Bestellnummer', 'Artikelnummer', 'Artikel-Nr.', 'Art.-Nr.', 'Lieferantennummer'],
      ...[
        'Lieferanten-Artikelnummer',
        'référence fournisseur',
        'réf. fournisseur',
        'code article',
        'code commande',
      ],
    ],
  },
  {
    key: 'currency',
    label: 'currency',
    kind: 'currency',
    expected: 'a code of ISO 4217 such as EUR',
    synonyms: ['curr', 'ccy', 'Währung', 'Waehrung', 'devise', 'monnaie'],
  },
  {
    key: 'quantity',
    label: OFFER_FIELDS.minimumQuantity.label,
    kind: 'count',
    expected: 'a whole number from 1',
    synonyms: [
      ...['quantity', 'qty', 'from quantity', 'break', 'price break', 'break quantity', 'min qty'],
      ...['Menge', 'ab Menge', 'Staffel', 'Staffelmenge', 'Stückzahl', 'quantité', 'qté', 'à partir de'],
    ],
  },
  {
    key: 'unitPrice',
    label: 'unit price',
    kind: 'price',
    expected: 'a number above 0 with at most four decimals',
    synonyms: [
      ...['price', 'price each', 'net price', 'cost', 'unit cost'],
      ...[
        'Preis',
        'Stückpreis',
        'Einzelpreis',
        'Nettopreis',
        'Staffelpreis',
        'Preis je Stück',
        'Preis/Stück',
      ],
      ...['prix', 'prix unitaire', 'prix net', 'PU', 'PU HT'],
    ],
  },
  {
    key: 'minimumOrderQuantity',
    label: OFFER_FIELDS.minimumOrderQuantity.label,
    kind: 'count',
    expected: 'a whole number from 1',
    synonyms: [
      ...['minimum order quantity', 'minimum order', 'min order qty', 'min. order'],
      ...[
        'Mindestbestellmenge',
        'Mindestmenge',
        'Mindestabnahme',
        'quantité minimale',
        'minimum de commande',
        'QMC',
      ],
    ],
  },
  {
    key: 'orderMultiple',
    label: OFFER_FIELDS.orderMultiple.label,
    kind: 'count',
    expected: 'a whole number from 1',
    synonyms: [
      ...['multiple', 'order increment', 'pack size', 'packaging unit', 'standard pack', 'spq'],
      ...[
        'Verpackungseinheit',
        'VPE',
        'VE',
        'Bestellvielfaches',
        'Gebinde',
        'conditionnement',
        'multiple de commande',
      ],
    ],
  },
  {
    key: 'leadTimeDays',
    label: OFFER_FIELDS.leadTimeDays.label,
    kind: 'lead-time',
    expected: 'a whole number of days or weeks, such as 6 weeks',
    synonyms: ['delivery', 'delivery time', 'Lieferzeit', 'Lieferfrist', 'délai', 'délai de livraison'],
  },
  {
    key: 'stock',
    label: OFFER_FIELDS.stock.label,
    kind: 'count',
    expected: 'a whole number from 0',
    synonyms: [
      ...['in stock', 'stock quantity', 'available', 'availability', 'on hand'],
      ...['Bestand', 'Lagerbestand', 'Lager', 'verfügbar', 'en stock', 'disponible', 'disponibilité'],
    ],
  },
  {
    key: 'validFrom',
    label: 'valid from',
    kind: 'day',
    expected: 'a day such as 2026-12-31',
    synonyms: [
      'from date',
      'start date',
      'gültig ab',
      'gültig von',
      'valable à partir du',
      'valable du',
      'début',
    ],
  },
  {
    key: 'validUntil',
    label: 'valid until',
    kind: 'day',
    expected: 'a day such as 2026-12-31',
    synonyms: [
      ...['valid to', 'valid till', 'expiry', 'expires', 'expiry date', 'end date', 'quote expires'],
      ...['gültig bis', 'Bindefrist', "valable jusqu'au", "valide jusqu'au", 'fin de validité', 'échéance'],
    ],
  },
];

/** The field of a key, which must be one of a price list. */
export function priceField(key: string): PriceField {
  return PRICE_FIELDS.find((field) => field.key === key)!;
}
