import { AMPLIFIER_TEMPERATURE_MODELS, CONDITION_FIELDS } from '@roothertz/common/conditions';
import type { ReactNode } from 'react';
import { BandFields } from './BandFields';
import { ConditionField } from './ConditionField';
import styles from './ConditionList.module.css';
import { useConditionsForm } from './ConditionsContext';
import { PartsFilter } from './PartsFilter';
import { hasStageField, stageKindOf } from './stageKind';
import { SupplyFields } from './SupplyFields';

const MODEL_LABELS = { estimated: 'carried to ambient', none: 'as at 25 °C' };

interface ConditionListProps {
  /** The resistors of the network are what is sought. */
  isNetworkSought: boolean;
}

/** What isn't on the schematic: band, temperature, limits, target and which parts count. */
export function ConditionList({ isNetworkSought }: ConditionListProps) {
  const { conditions } = useConditionsForm().request;
  const kind = stageKindOf(conditions.stage);
  return (
    <div className={styles.list}>
      <Row label="Band">
        <BandFields />
      </Row>
      <Row label="Low-pass order" note={conditions.band.lowPassOrder > 0 ? 'Butterworth' : 'brick wall'}>
        <ConditionField path="conditions.band.lowPassOrder" />
      </Row>
      <Row label="Reference frequency">
        <ConditionField path="conditions.referenceFrequency" />
      </Row>
      <Row label="Ambient">
        <ConditionField path="conditions.ambientTemperature" />
      </Row>
      <Row label="Amplifier’s figures">
        <TemperatureModel />
      </Row>
      <Row label="Bandwidth margin" note="× the band">
        <ConditionField path="conditions.bandwidthMargin" />
      </Row>
      <Row label="Supply, total">
        <SupplyFields />
      </Row>
      <Row label="Channels, at least">
        <ConditionField path="filter.channels" emptyText="any" />
      </Row>
      {hasStageField(kind, 'network') && kind !== 'transimpedance' && (
        <Row label="Output drives at least">
          <ConditionField path="conditions.stage.network.minimumTotal" emptyText="not stated" />
        </Row>
      )}
      <ExcessRows isNetworkSought={isNetworkSought} />
      <Row label="Target, input rms">
        <ConditionField path="target.inputNoiseRms" emptyText="none" />
      </Row>
      <Row label="Quantity">
        <ConditionField path="quantity" />
      </Row>
      <PartsFilter />
    </div>
  );
}

/** What makes the excess noise of the network: the voltage over it, and what its resistors make of that. */
function ExcessRows({ isNetworkSought }: ConditionListProps) {
  const { stage } = useConditionsForm().request.conditions;
  const kind = stageKindOf(stage);
  if (!hasStageField(kind, 'outputVoltage')) return null;
  const hasGainResistor = hasStageField(kind, 'gainNoiseIndex');
  return (
    <>
      <Row label="Direct output voltage">
        <ConditionField path="conditions.stage.outputVoltage" emptyText="none" />
      </Row>
      {!isNetworkSought && Boolean(stage.outputVoltage) && (
        <Row label={<NoiseIndexLabel hasGainResistor={hasGainResistor} />}>
          {hasGainResistor && (
            <>
              <ConditionField path="conditions.stage.gainNoiseIndex" emptyText="none" /> and{' '}
            </>
          )}
          <ConditionField path="conditions.stage.feedbackNoiseIndex" emptyText="none" />
        </Row>
      )}
    </>
  );
}

function NoiseIndexLabel({ hasGainResistor }: { hasGainResistor: boolean }) {
  return (
    <>
      Noise index,{' '}
      {hasGainResistor && (
        <>
          R<sub>g</sub> and{' '}
        </>
      )}
      R<sub>f</sub>
    </>
  );
}

function Row({ label, note, children }: { label: ReactNode; note?: string; children: ReactNode }) {
  return (
    <div className={styles.row}>
      <span className={styles.label}>{label}</span>
      <span className={styles.values}>
        {children}
        {note && <span className={styles.label}> {note}</span>}
      </span>
    </div>
  );
}

function TemperatureModel() {
  const { request, change } = useConditionsForm();
  return (
    <select
      className={styles.choice}
      aria-label="how the amplifier’s figures are carried to the ambient temperature"
      title={CONDITION_FIELDS['conditions.ambientTemperature'].help}
      value={request.conditions.amplifierTemperatureModel}
      onChange={(event) => change('conditions.amplifierTemperatureModel', event.target.value)}
    >
      {AMPLIFIER_TEMPERATURE_MODELS.map((model) => (
        <option key={model} value={model}>
          {MODEL_LABELS[model]}
        </option>
      ))}
    </select>
  );
}
