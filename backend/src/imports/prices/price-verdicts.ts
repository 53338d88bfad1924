import { type Doubt, judgeOffer, type LineVerdict, type PriceRowReader } from '@roothertz/common/imports';
import type { OfferTerms } from '@roothertz/common/prices';
import type { QuotedOffer } from '../../prices/quoted-offers.service.js';
import { refusedRow } from '../check/row-writer.js';
import { type PartUses, useRemark } from '../check/use-remark.js';
import type { StoredRow } from '../stored-row.js';
import type { OfferGroup, ReadLine } from './offer-groups.js';
import type { OfferPlace } from './offer-places.js';

/** Gives the offers of one price list their verdicts; it remembers which offers that stand are spoken of. */
export class PriceVerdicts {
  private readonly spokenOf = new Map<number, number>();

  constructor(
    private readonly reader: PriceRowReader,
    private readonly today: string,
    private readonly uses: PartUses,
  ) {}

  /** The rows of a group as they are stored. */
  of(group: OfferGroup, place: OfferPlace): [ReadLine, StoredRow][] {
    if ('why' in place) return this.refuseAll(group, place);
    const { existing } = place;
    const before = this.spokenOf.get(existing?.id ?? 0);
    if (before !== undefined) {
      const why = `stands on line ${before} too, under another supplier’s number`;
      return this.refuseAll(group, { field: 'partNumber', why, expected: 'each offer once' });
    }
    const { terms, lines } = judgeOffer(this.reader, group.lines, existing?.terms ?? null, this.today);
    if (existing !== null && terms !== null) this.spokenOf.set(existing.id, group.lines[0].line);
    const carrier = lines.findIndex(({ state }) => state !== 'unchanged' && state !== 'refused');
    return group.lines.map((line, index): [ReadLine, StoredRow] => {
      const verdict = lines[index];
      if (verdict.state === 'refused') return [line, refusedRow(line, verdict.errors)];
      const row = acceptedRow(line, verdict);
      if (index !== carrier) return [line, row];
      const offer = quotedOffer(group, place, terms!);
      const remarks = [...supplierDoubt(group, place), ...useRemark(this.uses, place.partId)];
      return [line, { ...row, doubts: [...verdict.doubts, ...remarks], offer }];
    });
  }

  /** A row that can't be told to belong to an offer, or can't be read. */
  apart(line: ReadLine): StoredRow {
    return refusedRow(line, line.row.errors);
  }

  private refuseAll(
    { lines }: OfferGroup,
    { field, why, expected }: Extract<OfferPlace, { why: string }>,
  ): [ReadLine, StoredRow][] {
    return lines.map((line) => {
      const error = { ...this.reader.errorAt(field, why, line.cells), expected };
      return [line, refusedRow(line, [...line.row.errors, error])];
    });
  }
}

function acceptedRow({ line, row: { names } }: ReadLine, { state, changes, doubts }: LineVerdict): StoredRow {
  return { line, state, ...names!, changes, doubts };
}

function quotedOffer(
  { supplier }: OfferGroup,
  { partId, existing }: Extract<OfferPlace, { partId: number }>,
  terms: OfferTerms,
): QuotedOffer {
  if (existing === null) return { partId: String(partId), supplier, ...terms };
  return { id: String(existing.id), version: existing.version, ...terms };
}

function supplierDoubt(
  { supplier }: OfferGroup,
  { isNewSupplier }: Extract<OfferPlace, { partId: number }>,
): Doubt[] {
  if (!isNewSupplier) return [];
  const message = `${supplier} is no supplier of yours yet: applying the list adds it`;
  return [{ code: 'new-supplier', field: 'supplier', message }];
}
