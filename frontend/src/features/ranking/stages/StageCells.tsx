import { CAUTION_DETAILS, CAUTION_LABELS } from '@roothertz/common/noise';
import styles from './StageCells.module.css';
import type { StageRow } from './stageRows';

/** The op-amp over its maker, and what one should know of it. */
export function StagePartCell({ name, library, maker, cautions }: StageRow['part']) {
  const [caution] = cautions;
  const title = [
    [name, library, maker].filter(Boolean).join(' '),
    ...cautions.map((key) => CAUTION_DETAILS[key]),
  ].join('\n');
  return (
    <span className={styles.two} title={title}>
      {name && (
        <span className={styles.name}>
          {name}
          {library && <span className={styles.library}> {library}</span>}
        </span>
      )}
      <span className={styles.second}>
        {maker}
        {caution && <span className={styles.caution}> △ {CAUTION_LABELS[caution]}</span>}
      </span>
    </span>
  );
}

/** R_g over R_f, each with its part number. */
export function NetworkCell({ parts }: { parts: StageRow['network'] }) {
  const title = parts.map(
    ({ symbol, value, partNumber, maker }) => `${symbol} ${value}: ${partNumber} ${maker}`,
  );
  return (
    <span className={styles.two} title={title.join('\n')}>
      {parts.map(({ symbol, value, partNumber }) => (
        <span key={symbol}>
          <span className="visually-hidden">{symbol} </span>
          <span className={styles.value}>{value}</span>
          <span className={styles.second}>{partNumber}</span>
        </span>
      ))}
    </span>
  );
}

export function NetworkHeading({ hasGainResistor }: { hasGainResistor: boolean }) {
  return (
    <span>
      {hasGainResistor && (
        <>
          R<sub>g</sub>,{' '}
        </>
      )}
      R<sub>f</sub>
    </span>
  );
}

/** The gain over the number of channels in parallel, where there is more than one. */
export function GainCell({ text, channelsInParallel }: StageRow['gain']) {
  return (
    <span className={styles.two}>
      {text && <span>{text}</span>}
      {channelsInParallel > 1 && (
        <span className={styles.second} title={`${channelsInParallel} channels in parallel`}>
          {channelsInParallel}
          <span aria-hidden="true">{'\u2009'}∥</span>
          <span className="visually-hidden"> channels in parallel</span>
        </span>
      )}
    </span>
  );
}

export function StageNoiseCell({ text, aboveFloor }: StageRow['noise']) {
  return (
    <span className={styles.two}>
      <span>{text}</span>
      <span className={styles.second}>{aboveFloor}</span>
    </span>
  );
}

/** What a stage costs, with the prices of its parts on hover. */
export function StagePriceCell({ text, title }: StageRow['price']) {
  return (
    <span className={styles.two} title={title}>
      <span>{text}</span>
    </span>
  );
}
