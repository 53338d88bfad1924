import { useQuery } from '@tanstack/react-query';
import { CONDITION_FIELDS } from '@roothertz/common/conditions';
import { dayOf, priceAt } from '@roothertz/common/prices';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { type Offer, partOffersQuery, ratesQuery } from '../../../api/prices';
import { detailOf } from '../../../api/problem';
import { QuantityInput } from '../../../components/QuantityInput';
import { useMayDo } from '../../../components/useMember';
import { costWords } from './costWords';
import { OfferTable } from './OfferTable';
import styles from './PartPrices.module.css';

/** What the team's suppliers ask for a part, and what a quantity of it costs. */
export function PartPrices({ partId }: { partId: string }) {
  const { data: offers, error } = useQuery(partOffersQuery(partId));
  const mayEdit = useMayDo('prices.edit');
  if (error) return <p role="alert">{detailOf(error)}</p>;
  if (!offers) return null;
  const link = <Link to={`/prices?partId=${partId}`}>{mayEdit ? 'Edit its prices' : 'See its prices'}</Link>;
  if (offers.current.length === 0)
    return (
      <p className={styles.quiet}>
        The team has no price for this part.{' '}
        {mayEdit ? <Link to={`/prices?partId=${partId}`}>Enter one</Link> : 'Purchasing can enter one.'}
      </p>
    );
  return (
    <>
      <CostAtQuantity offers={offers.current} />
      <OfferTable offers={offers.current} />
      <p className={styles.link}>{link}</p>
    </>
  );
}

function CostAtQuantity({ offers }: { offers: readonly Offer[] }) {
  const [quantity, setQuantity] = useState(100);
  const { data: rates } = useQuery(ratesQuery);
  if (!rates) return null;
  const { currency, items } = rates;
  const exchange = Object.fromEntries(items.map((rate) => [rate.currency, rate.rate]));
  const priced = offers.map(({ supplier, ...terms }) => ({ ...terms, supplier: supplier.name }));
  const price = priceAt(priced, quantity, exchange, currency, dayOf(new Date()));
  return (
    <div className={styles.cost}>
      <label>
        Quantity{' '}
        <QuantityInput
          variant="inline"
          field={CONDITION_FIELDS.quantity}
          value={quantity}
          onCommit={(value) => value !== null && setQuantity(value)}
        />
      </label>
      <p role="status">
        {price ? costWords(price, quantity, currency) : 'No offer holds today in a currency with a rate.'}
      </p>
    </div>
  );
}
