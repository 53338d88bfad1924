import { Button } from 'antd';
import { useMayDo } from '../../components/useMember';
import { WhyNot } from '../../components/WhyNot';

interface NoPricesProps {
  /** A search or a filter hides offers. */
  isNarrowed: boolean;
  onShowAll: () => void;
  onShowMissing: () => void;
}

/** What to do where the grid is empty. */
export function NoPrices({ isNarrowed, onShowAll, onShowMissing }: NoPricesProps) {
  const mayEdit = useMayDo('prices.edit');
  if (isNarrowed)
    return (
      <p>
        Nothing matches. <InlineButton onClick={onShowAll}>Show all offers</InlineButton>.
      </p>
    );
  if (!mayEdit)
    return (
      <p>
        There are no prices yet.{' '}
        <WhyNot
          action="prices.edit"
          byRole="Purchasing or an admin of your team can enter them."
          byPlan="Your team’s plan has none; the Team plan has them."
        />
      </p>
    );
  return (
    <p>
      There are no prices yet.{' '}
      <InlineButton onClick={onShowMissing}>Show your parts without a price</InlineButton> to type or paste
      them in.
    </p>
  );
}

function InlineButton({ onClick, children }: { onClick: () => void; children: string }) {
  return (
    <Button type="link" style={{ padding: 0, height: 'auto' }} onClick={onClick}>
      {children}
    </Button>
  );
}
