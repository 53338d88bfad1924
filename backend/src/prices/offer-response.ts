import { offerStates } from '@roothertz/common/prices';
import { type PartName, toPartName } from '../library/readable-parts.js';
import { toMemberDto } from '../shared/members/member.dto.js';
import type { OfferedPartDto, OfferResponseDto } from './dto/offer-response.dto.js';
import { toSupplierResponse } from './dto/supplier.dto.js';
import type { Offer } from './entities/offer.entity.js';
import { termsOf } from './offer-terms.js';

/** Against what an offer is stale or expiring. */
export interface OfferView {
  staleAfterDays: number;
  today: string;
}

export function toOfferResponse(offer: Offer, { staleAfterDays, today }: OfferView): OfferResponseDto {
  const confirmedAt = offer.confirmedAt.toISOString();
  const { breaks, ...terms } = termsOf(offer);
  return {
    id: String(offer.id),
    part: toOfferedPart(toPartName(offer.part)),
    supplier: toSupplierResponse(offer.supplier),
    ...terms,
    breaks: [...breaks],
    confirmedAt,
    confirmedBy: toMemberDto(offer.confirmedBy),
    openedAt: offer.openedAt.toISOString(),
    openedBy: toMemberDto(offer.openedBy),
    closedAt: offer.closedAt && offer.closedAt.toISOString(),
    closedBy: toMemberDto(offer.closedBy),
    states: offerStates({ confirmedAt, validUntil: offer.validUntil }, staleAfterDays, today),
    version: offer.version,
  };
}

export function toOfferedPart({ id, ...name }: PartName): OfferedPartDto {
  return { id: String(id), ...name };
}
