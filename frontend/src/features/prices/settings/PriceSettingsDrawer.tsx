import { useQuery } from '@tanstack/react-query';
import { Drawer, Skeleton } from 'antd';
import { priceSettingsQuery, ratesQuery } from '../../../api/prices';
import { detailOf } from '../../../api/problem';
import { useMayDo } from '../../../components/useMember';
import { RatesForm } from './RatesForm';
import { SettingsForm } from './SettingsForm';

interface PriceSettingsDrawerProps {
  isOpen: boolean;
  onClose: () => void;
}

/** In which currency the team sees prices, at which rates, and from when on a price is stale. */
export function PriceSettingsDrawer({ isOpen, onClose }: PriceSettingsDrawerProps) {
  const settings = useQuery({ ...priceSettingsQuery, enabled: isOpen });
  const rates = useQuery({ ...ratesQuery, enabled: isOpen });
  const mayEdit = useMayDo('prices.edit');
  const error = settings.error ?? rates.error;
  return (
    <Drawer open={isOpen} onClose={onClose} title="Currency and exchange rates" size={420}>
      {error ? (
        <p role="alert">{detailOf(error)}</p>
      ) : settings.data && rates.data ? (
        <>
          <SettingsForm
            key={`settings ${settings.dataUpdatedAt}`}
            settings={settings.data}
            mayEdit={mayEdit}
          />
          <RatesForm key={`rates ${rates.dataUpdatedAt}`} rates={rates.data} mayEdit={mayEdit} />
        </>
      ) : (
        <Skeleton />
      )}
    </Drawer>
  );
}
