import type { Order, PriceAtQuantity } from '@roothertz/common/prices';
import { grouped } from '../../../components/countOf';
import { priceText } from '../../../components/priceText';

/** What a quantity costs in a sentence, and in another that more pieces cost less in all where they do. */
export function costWords(price: PriceAtQuantity, quantity: number, currency: string): string {
  const { cheaperOrder } = price;
  const more = cheaperOrder && ` ${cheaperWords(cheaperOrder, currency)}`;
  return `${orderWords(price, quantity, currency)}${more ?? ''}`;
}

function orderWords(order: Order, quantity: number, currency: string): string {
  const { offer, orderQuantity, unitPrice, total } = order;
  const pieces = `${grouped(quantity)} ${quantity === 1 ? 'piece costs' : 'pieces cost'}`;
  const each = `${priceText({ amount: unitPrice, currency })} each`;
  const ordered =
    orderQuantity === quantity ? 'in all' : `in all, for ${grouped(orderQuantity)} have to be bought`;
  const wait = offer.leadTimeDays === null ? '' : `, delivered in ${days(offer.leadTimeDays)}`;
  return `${pieces} ${each} from ${offer.supplier}, ${priceText({ amount: total, currency })} ${ordered}${wait}.`;
}

function cheaperWords({ offer, orderQuantity, total }: Order, currency: string): string {
  const pieces = grouped(orderQuantity);
  return `${pieces} from ${offer.supplier} cost less in all: ${priceText({ amount: total, currency })}.`;
}

function days(count: number): string {
  return `${count} ${count === 1 ? 'day' : 'days'}`;
}
