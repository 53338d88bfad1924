import type { QuantityPrices } from '../prices/price-book.js';
import type { PriceDto } from './dto/price.dto.js';

/** What a part costs; null where the team has no price for it. */
export function toPrice(prices: QuantityPrices, partId: number): PriceDto | null {
  const price = prices.of(partId);
  if (price === null) return null;
  const { offer, unitPrice, minimumQuantity, orderQuantity, total, cheaperOrder } = price;
  return {
    amount: unitPrice,
    currency: prices.book.currency,
    minimumQuantity,
    orderQuantity,
    total,
    cheaperOrder: cheaperOrder && { orderQuantity: cheaperOrder.orderQuantity, total: cheaperOrder.total },
    supplier: offer.supplier,
    leadTimeDays: offer.leadTimeDays,
    stock: offer.stock,
    isStale: prices.isStale(offer),
  };
}
