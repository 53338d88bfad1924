import type { ReactNode } from 'react';
import type { SymbolName } from './layout';

/** Graphical symbols of IEC 60617, each with its middle at the origin and lying along the x axis. */
export const SYMBOLS: Record<SymbolName, ReactNode> = {
  resistor: <rect x={-15} y={-5.5} width={30} height={11} />,
  capacitor: <path d="M-2.5-9V9M2.5-9V9" />,
  coil: <path d="M-18 0a4.5 4.5 0 0 1 9 0a4.5 4.5 0 0 1 9 0a4.5 4.5 0 0 1 9 0a4.5 4.5 0 0 1 9 0" />,
  ground: <path d="M-9 0H9M-5.5 3.5H5.5M-2 7H2" />,
  voltageSource: (
    <>
      <circle r={12} />
      <path d="M-6 0c2-5.5 4-5.5 6 0s4 5.5 6 0" />
    </>
  ),
  currentSource: (
    <>
      <circle r={12} />
      <path d="M-12 0H12" />
    </>
  ),
  plusInput: <path d="M-3.5 0H3.5M0-3.5V3.5" />,
  minusInput: <path d="M-3.5 0H3.5" />,
  node: <circle r={2.2} fill="currentColor" />,
  terminal: <circle r={2.2} fill="var(--paper)" />,
};
