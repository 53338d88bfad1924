import { checkConditions, type OperatingConditions } from '@roothertz/common/conditions';
import { cellConditions, quietestMapInPieces } from '@roothertz/common/noise';
import type { FieldError } from '@roothertz/common/parts';
import { Injectable } from '@nestjs/common';
import type { Caller } from '../shared/access/caller.js';
import {
  refuseConditions,
  toOperatingConditions,
  toPartFilter,
} from '../shared/conditions/ranking-request.js';
import { betweenOtherWork } from '../shared/in-pieces/between-other-work.js';
import type { QuietestMapDto, QuietestMapResponseDto } from './dto/quietest-map.dto.js';
import { LibraryIndex, revisionOf } from './library-index.service.js';
import { partNameAt } from './part-at.js';

@Injectable()
export class QuietestMapService {
  constructor(private readonly index: LibraryIndex) {}

  async draw(caller: Caller, dto: QuietestMapDto): Promise<QuietestMapResponseDto> {
    const { resistance, frequency } = dto;
    const conditions = toOperatingConditions(dto.conditions);
    const filter = toPartFilter(dto.filter);
    refuseConditions([...checkAxes(dto), ...checkCells(conditions, dto)]);
    const libraries = await this.index.opAmpsReadableBy(caller, filter);
    const map = await betweenOtherWork(
      quietestMapInPieces(
        { conditions, filter, resistance, frequency },
        libraries.map(({ columns }) => columns),
      ),
    );
    const parts = map.parts.map((place) => partNameAt(place, libraries));
    return { ...map, parts, libraryRevision: revisionOf(libraries) };
  }
}

function checkAxes({ resistance, frequency }: QuietestMapDto): FieldError[] {
  return Object.entries({ resistance, frequency }).flatMap(([axis, { from, to }]) =>
    to > from ? [] : [{ field: `${axis}.to`, message: 'a value above the axis’s beginning was expected' }],
  );
}

/** The axes give resistance and frequency: what else contradicts itself does so in every cell. */
function checkCells(
  conditions: OperatingConditions,
  { resistance, frequency }: QuietestMapDto,
): FieldError[] {
  const cell = cellConditions(conditions, resistance.from, frequency.from);
  return checkConditions({ conditions: cell }).map(({ field, message }) =>
    field === 'conditions.band.lower'
      ? { field: 'frequency.from', message: 'a frequency of 2 µHz or more was expected' }
      : { field, message },
  );
}
