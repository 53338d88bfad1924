import type { Offer } from '../../../api/prices';
import { formatDay } from '../../../components/formatDay';
import { priceText } from '../../../components/priceText';
import { STATE_LABELS } from '../pricesView';
import { Table } from '../../../components/Table';
import styles from './PartPrices.module.css';

/** Each offer with its prices and what goes with them. */
export function OfferTable({ offers }: { offers: readonly Offer[] }) {
  return (
    <Table stacks className={styles.table}>
      <thead>
        <tr>
          <th scope="col">Supplier</th>
          <th scope="col">Price from a quantity on</th>
          <th scope="col">MOQ</th>
          <th scope="col">Lead time</th>
          <th scope="col">Stock</th>
          <th scope="col">Last confirmed</th>
        </tr>
      </thead>
      <tbody>
        {offers.map((offer) => (
          <OfferRow key={offer.id} offer={offer} />
        ))}
      </tbody>
    </Table>
  );
}

function OfferRow({ offer }: { offer: Offer }) {
  const { supplier, supplierNumber, breaks, currency, minimumOrderQuantity, orderMultiple } = offer;
  const { leadTimeDays, stock, confirmedAt, states } = offer;
  return (
    <tr>
      <th scope="row">
        {supplier.name} <span className={styles.quiet}>{supplierNumber}</span>
      </th>
      <td>
        {breaks.map(({ minimumQuantity, unitPrice }) => (
          <span key={minimumQuantity} className={styles.break}>
            <span className={styles.quiet}>{minimumQuantity}:</span>{' '}
            {priceText({ amount: unitPrice, currency })}
          </span>
        ))}
      </td>
      <td data-label="MOQ">
        {minimumOrderQuantity}
        {orderMultiple > 1 && <span className={styles.quiet}> in steps of {orderMultiple}</span>}
      </td>
      <td data-label="lead time">{leadTimeDays === null ? <Unknown /> : `${leadTimeDays} d`}</td>
      <td data-label="stock">{stock ?? <Unknown />}</td>
      <td data-label="confirmed">
        {formatDay(confirmedAt)}{' '}
        <span className={states.includes('expired') ? styles.alarm : styles.caution}>
          {states.map((state) => STATE_LABELS[state]).join(', ')}
        </span>
      </td>
    </tr>
  );
}

function Unknown() {
  return <span className={styles.quiet}>unknown</span>;
}
