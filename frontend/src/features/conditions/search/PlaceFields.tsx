import { formatQuantity } from '@roothertz/common/units';
import { useConditionsForm } from '../ConditionsContext';
import { placesOf, type CircuitPlace } from './placesOf';
import { SearchFieldInput } from './SearchFieldInput';
import styles from './SearchFields.module.css';
import { TechnologyChoice } from './TechnologyChoice';
import { ToleranceChoice } from './ToleranceChoice';
import type { useSearchAddress } from './useSearchAddress';

type PlaceFieldsProps = Pick<
  ReturnType<typeof useSearchAddress>,
  'place' | 'technologies' | 'chooseTechnologies' | 'tolerance' | 'limitTolerance'
>;

/** The place in the circuit for which a resistor is sought; band and temperature are those of the conditions. */
export function PlaceFields({ place: form, ...choices }: PlaceFieldsProps) {
  const places = placesOf(useConditionsForm().request);
  return (
    <div role="group" aria-label="Place of the resistor" className={styles.line}>
      <span>
        <SearchFieldInput form={form} name="r" label="Value" />
        <span className={styles.fills}>
          {places.map((place) => (
            <FillButton
              key={place.symbol}
              place={place}
              onFill={() => form.change({ r: place.resistance })}
            />
          ))}
        </span>
      </span>
      <SearchFieldInput form={form} name="rtol" label="within" />
      <SearchFieldInput form={form} name="vr" label="direct voltage across it" />
      <ToleranceChoice most={choices.tolerance} onChange={choices.limitTolerance} />
      <TechnologyChoice chosen={choices.technologies} onChange={choices.chooseTechnologies} />
    </div>
  );
}

function FillButton({ place: { symbol, resistance }, onFill }: { place: CircuitPlace; onFill: () => void }) {
  const [letter, index] = symbol.split('_');
  const text = formatQuantity(resistance, 'resistance', { trim: true });
  return (
    <button type="button" className={styles.fill} title={`take the schematic’s ${text}`} onClick={onFill}>
      as {letter}
      <sub>{index}</sub>
    </button>
  );
}
