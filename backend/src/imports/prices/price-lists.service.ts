import { Injectable } from '@nestjs/common';
import type { ListWork } from '../list-work.js';
import { ApplyPriceList } from './apply-price-list.service.js';
import { CheckPriceList } from './check-price-list.service.js';
import { UndoPriceList } from './undo-price-list.service.js';

/** The work on price lists of suppliers. */
@Injectable()
export class PriceLists implements ListWork {
  constructor(
    readonly checking: CheckPriceList,
    readonly applying: ApplyPriceList,
    readonly undoing: UndoPriceList,
  ) {}
}
