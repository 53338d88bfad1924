import type { ReactNode } from 'react';
import type { Contributions } from '@roothertz/common/noise';
import { ConditionList } from './ConditionList';
import { ConditionsContext, type ConditionsForm } from './ConditionsContext';
import { Schematic } from './schematic/Schematic';
import { StageSwitch } from './StageSwitch';

interface ConditionsPanelProps {
  form: ConditionsForm;
  /** The selected part's shares of the noise power; null while there is none. */
  shares: Contributions | null;
  /** The resistors of the network are what is sought. */
  isNetworkSought: boolean;
  /** What is to be known of the values in the schematic. */
  note?: ReactNode;
}

/** The operating conditions: the schematic, which is the form, and the list of what it doesn't show. */
export function ConditionsPanel({ form, shares, isNetworkSought, note }: ConditionsPanelProps) {
  return (
    <ConditionsContext value={form}>
      <StageSwitch />
      <Schematic shares={shares} />
      {note}
      <ConditionList isNetworkSought={isNetworkSought} />
    </ConditionsContext>
  );
}
