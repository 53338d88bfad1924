import { PRICED_RANKING_SORTS } from '@roothertz/common/noise';
import { RankingRequestDto } from '../../shared/conditions/ranking-request.dto.js';
import { Text } from '../../shared/validation/text.decorator.js';
import { PageLimit, PageOffset } from '../page.decorators.js';

/** What both the ranking and the list of excluded parts are asked with. */
export class RankOpAmpsDto extends RankingRequestDto {
  @Text({
    label: 'sort',
    maxLength: 60,
    optional: true,
    description: `One of ${PRICED_RANKING_SORTS.join(', ')}; a leading minus = descending.`,
  })
  sort: string = 'inputNoiseRms';

  @PageLimit()
  limit: number = 50;

  @PageOffset()
  offset: number = 0;
}
