import { useQuery } from '@tanstack/react-query';
import { priceCountsQuery, priceSettingsQuery } from '../../api/prices';
import type { ChangeFields } from '../../components/useAddressFields';
import { countOf, grouped } from '../../components/countOf';
import styles from './PricesFacts.module.css';
import { PRICE_STATES, type PricesView } from './pricesView';

interface PricesFactsProps {
  view: PricesView;
  change: ChangeFields;
}

/** What there is to look after, on a line; each of it narrows the grid to itself, and a second click to all again. */
export function PricesFacts({ view, change }: PricesFactsProps) {
  const { data: counts } = useQuery(priceCountsQuery);
  const { data: settings } = useQuery(priceSettingsQuery);
  if (!counts || !settings) return <p className={styles.facts} />;
  const help = {
    stale: `not confirmed for more than ${settings.staleAfterDays} days`,
    expiring: 'ends within 30 days',
    expired: 'has ended: it no longer counts',
    missing: 'parts of your own library without an offer',
  };
  const words = { stale: 'stale', expiring: 'expiring', expired: 'expired', missing: 'without a price' };
  return (
    <div className={styles.facts} role="group" aria-label="What calls for a look">
      <span>{countOf(counts.offers, 'offer')}</span>
      {PRICE_STATES.map((state) => {
        const isOn = view.state?.includes(state) ?? false;
        const library = !isOn && state === 'missing' ? 'team' : undefined;
        return (
          <Fact
            key={state}
            isOn={isOn}
            help={help[state]}
            onClick={() => change({ state: isOn ? undefined : state, library })}
          >
            {grouped(counts[state])} {words[state]}
          </Fact>
        );
      })}
      <Fact
        isOn={view.usedInConditions ?? false}
        help="parts that are chosen in saved conditions"
        onClick={() => change({ usedInConditions: view.usedInConditions ? undefined : 'true' })}
      >
        {grouped(counts.usedInConditions)} used in saved conditions
      </Fact>
    </div>
  );
}

interface FactProps {
  isOn: boolean;
  help: string;
  onClick: () => void;
  children: React.ReactNode;
}

function Fact({ isOn, help, onClick, children }: FactProps) {
  return (
    <button type="button" className={styles.fact} aria-pressed={isOn} title={help} onClick={onClick}>
      {children}
    </button>
  );
}
