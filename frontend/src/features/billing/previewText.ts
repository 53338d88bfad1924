import type { SeatPreview } from '../../api/billing';
import { moneyText } from './moneyText';

/** What a change of seats costs, said before it is made. */
export function previewText({ dueNow, monthly }: SeatPreview): string {
  const later = `${moneyText(monthly)} a month from the next invoice on`;
  const now = Number(dueNow.amount);
  if (now === 0) return `Nothing now, and ${later}.`;
  const credit = moneyText({ ...dueNow, amount: String(-now) });
  return now > 0
    ? `${moneyText(dueNow)} now for the rest of this month, and ${later}.`
    : `${credit} for the rest of this month is credited to the next invoices, and ${later}.`;
}
