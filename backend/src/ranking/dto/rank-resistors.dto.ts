import { RESISTOR_SORTS } from '@roothertz/common/noise';
import { ResistorRankingRequestDto } from '../../shared/conditions/resistor-ranking-request.dto.js';
import { Text } from '../../shared/validation/text.decorator.js';
import { PageLimit, PageOffset } from '../page.decorators.js';

/** What both the ranking of resistors and the list of excluded ones are asked with. */
export class RankResistorsDto extends ResistorRankingRequestDto {
  @Text({
    label: 'sort',
    maxLength: 60,
    optional: true,
    description: `One of ${RESISTOR_SORTS.join(', ')}; a leading minus = descending.`,
  })
  sort: string = 'totalRms';

  @PageLimit()
  limit: number = 50;

  @PageOffset()
  offset: number = 0;
}
