import { gapFields, INPUT_TYPES, type InputType, OP_AMP_CATALOGUE } from '@roothertz/common/parts';
import { IntersectionType, OmitType } from '@nestjs/swagger';
import { Options } from '../../shared/validation/option.decorator.js';
import { IN_QUERY, ListPartsDto } from './list-parts.dto.js';
import { WantedStandingDto } from './matching-standings.dto.js';

const MISSING = gapFields(OP_AMP_CATALOGUE).map(({ key }) => key);

export class ListOpAmpsDto extends ListPartsDto {
  @Options(INPUT_TYPES, IN_QUERY)
  inputType?: InputType[];

  @Options(MISSING, IN_QUERY)
  missing?: string[];
}

/** Which op-amps are meant, as the list narrows them. */
export class OpAmpMatchDto extends OmitType(ListOpAmpsDto, ['limit', 'offset', 'sort']) {}

export class OpAmpOutcomeDto extends IntersectionType(OpAmpMatchDto, WantedStandingDto) {}

/** What narrows the parts whose gaps are counted. */
export class OpAmpFilterDto extends OmitType(ListOpAmpsDto, ['limit', 'offset', 'sort', 'missing']) {}
