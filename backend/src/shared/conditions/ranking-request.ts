import {
  checkConditions,
  type OperatingConditions,
  type PartFilter,
  type RankingRequest,
} from '@roothertz/common/conditions';
import type { FieldError } from '@roothertz/common/parts';
import { instanceToPlain } from 'class-transformer';
import { DomainError } from '../errors/domain-error.js';
import type { OperatingConditionsDto } from './operating-conditions.dto.js';
import type { PartFilterDto } from './part-filter.dto.js';
import type { RankingRequestDto } from './ranking-request.dto.js';

/** A request as the noise model takes it: plain objects, with nothing that was left out and every default. */
export function toRankingRequest(dto: RankingRequestDto): Required<RankingRequest> {
  const { filter, target, quantity } = dto;
  return {
    conditions: toOperatingConditions(dto.conditions),
    filter: toPartFilter(filter),
    target: toPlain(target),
    quantity,
  };
}

export function toOperatingConditions(dto: OperatingConditionsDto): OperatingConditions {
  const { lower, upper } = dto.band;
  return toPlain({ ...dto, referenceFrequency: dto.referenceFrequency ?? Math.sqrt(lower * upper) });
}

export function toPartFilter(dto: PartFilterDto): PartFilter {
  return toPlain(dto);
}

/** As {@link toRankingRequest}, refused where its values contradict each other. */
export function checkedRankingRequest(dto: RankingRequestDto): Required<RankingRequest> {
  const request = toRankingRequest(dto);
  refuse(checkConditions(request));
  return request;
}

/** The conditions alone, refused where they contradict each other. */
export function checkedConditions(dto: OperatingConditionsDto): OperatingConditions {
  const conditions = toOperatingConditions(dto);
  refuse(checkConditions({ conditions }));
  return conditions;
}

function refuse(errors: FieldError[]): void {
  if (errors.length > 0)
    throw new DomainError('conditions.invalid', 'These operating conditions can’t be met.', { errors });
}

function toPlain<Plain>(dto: object): Plain {
  return instanceToPlain(dto, { exposeUnsetFields: false }) as Plain;
}
