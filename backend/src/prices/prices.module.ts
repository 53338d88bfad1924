import { Module } from '@nestjs/common';
import { AuditModule } from '../audit/audit.module.js';
import { ConditionsModule } from '../conditions/conditions.module.js';
import { OfferSaver } from './offer-saver.service.js';
import { OffersController } from './offers.controller.js';
import { OffersService } from './offers.service.js';
import { PartOffersController } from './part-offers.controller.js';
import { PartOffersService } from './part-offers.service.js';
import { PriceBookService } from './price-book.service.js';
import { PriceChanges } from './price-changes.service.js';
import { PriceListService } from './price-list.service.js';
import { PriceSettingsService } from './price-settings.service.js';
import { PricesController } from './prices.controller.js';
import { QuotedOffers } from './quoted-offers.service.js';
import { RatesService } from './rates.service.js';
import { SuppliersController } from './suppliers.controller.js';
import { SuppliersService } from './suppliers.service.js';

@Module({
  imports: [AuditModule, ConditionsModule],
  controllers: [SuppliersController, PricesController, OffersController, PartOffersController],
  providers: [
    OfferSaver,
    OffersService,
    PartOffersService,
    PriceBookService,
    PriceChanges,
    PriceListService,
    PriceSettingsService,
    QuotedOffers,
    RatesService,
    SuppliersService,
  ],
  exports: [PriceBookService, PriceListService, PriceSettingsService, QuotedOffers],
})
export class PricesModule {}
