import {
  checkConditions,
  type OperatingConditions,
  type PartFilter,
  type RankingRequest,
  checkResistorConditions,
  type ResistorRankingRequest,
} from '@roothertz/common/conditions';
import type { FieldError } from '@roothertz/common/parts';
import { instanceToPlain } from 'class-transformer';
import { DomainError } from '../errors/domain-error.js';
import type { OperatingConditionsDto } from './operating-conditions.dto.js';
import type { PartFilterDto } from './part-filter.dto.js';
import type { RankingRequestDto } from './ranking-request.dto.js';
import type { ResistorRankingRequestDto } from './resistor-ranking-request.dto.js';

/** A request as the noise model takes it: plain objects, with nothing that was left out and every default. */
function toRankingRequest(dto: RankingRequestDto): Required<RankingRequest> {
  const { filter, target, quantity } = dto;
  return {
    conditions: toOperatingConditions(dto.conditions),
    filter: toPartFilter(filter),
    target: toPlain(target),
    quantity,
  };
}

export function toOperatingConditions(dto: OperatingConditionsDto): OperatingConditions {
  return toPlainConditions(dto);
}

/** Conditions of any kind of stage as plain objects; the reference frequency has its default. */
export function toPlainConditions<Conditions>(
  dto: Pick<OperatingConditionsDto, 'band' | 'referenceFrequency'>,
): Conditions {
  const { lower, upper } = dto.band;
  return toPlain({ ...dto, referenceFrequency: dto.referenceFrequency ?? Math.sqrt(lower * upper) });
}

export function toPartFilter(dto: PartFilterDto): PartFilter {
  return toPlain(dto);
}

/** As {@link toRankingRequest}, refused where its values contradict each other. */
export function checkedRankingRequest(dto: RankingRequestDto): Required<RankingRequest> {
  const request = toRankingRequest(dto);
  refuseConditions(checkConditions(request));
  return request;
}

/** The conditions alone, refused where they contradict each other. */
export function checkedConditions(dto: OperatingConditionsDto): OperatingConditions {
  const conditions = toOperatingConditions(dto);
  refuseConditions(checkConditions({ conditions }));
  return conditions;
}

/** A request to rank resistors, refused where its values contradict each other. */
export function checkedResistorRequest({
  conditions,
  filter,
  quantity,
}: ResistorRankingRequestDto): Required<ResistorRankingRequest> {
  const request: Required<ResistorRankingRequest> = {
    conditions: toPlain(conditions),
    filter: toPlain(filter),
    quantity,
  };
  refuseConditions(checkResistorConditions(request));
  return request;
}

/** Refuses conditions with any errors. */
export function refuseConditions(errors: FieldError[]): void {
  if (errors.length > 0)
    throw new DomainError('conditions.invalid', 'These operating conditions can’t be met.', { errors });
}

function toPlain<Plain>(dto: object): Plain {
  return instanceToPlain(dto, { exposeUnsetFields: false }) as Plain;
}
