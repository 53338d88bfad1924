import type { RankingRequest } from '@roothertz/common/conditions';
import { NO_LEVER, type LeverKey } from '@roothertz/common/noise';
import { useMemo } from 'react';
import { leftToGain } from '../answer';
import type { PlottedPart } from '../comparedPart';
import type { SelectedPart } from '../useSelectedPart';
import { LeverItem } from './LeverItem';
import styles from './Levers.module.css';
import { atBestText, leverRows } from './leverRows';

interface LeversProps {
  selected: SelectedPart;
  request: RankingRequest;
  /** The next-quieter part of the ranking, where there is one. */
  quieter: PlottedPart | undefined;
  /** Levers that aren't listed because the ranking has pulled them. */
  pulled: readonly LeverKey[];
  onTry: (request: RankingRequest) => void;
  onSelect: (partId: string) => void;
}

/** What else would lower the selected part's noise, in dB; a click tries it. */
export function Levers({ selected, request, quieter, pulled, onTry, onSelect }: LeversProps) {
  const { part, figures } = selected;
  const all = useMemo(() => leverRows(request, part, quieter), [request, part, quieter]);
  const rows = all.filter(({ key }) => !pulled.includes(key));
  return (
    <section aria-label={`Levers for ${part.partNumber}`} className={styles.levers}>
      <h2 className={styles.heading}>Levers for {part.partNumber}</h2>
      <ul className={styles.list}>
        {rows.map((row) => (
          <LeverItem key={row.key} row={row} onTry={onTry} onSelect={onSelect} />
        ))}
        <li className={styles.lever} data-helps="false">
          <span className={styles.label}>A perfect amplifier, at best</span>
          <span className={styles.change}>{atBestText(leftToGain(figures.contributions))}</span>
        </li>
      </ul>
      <p className={styles.note}>{NO_LEVER}</p>
    </section>
  );
}
