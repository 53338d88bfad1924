import type { ReactNode } from 'react';
import type { Tokens } from '../../../theme';

const COLOURS = ['verdigris', 'ochre', 'damson', 'rust'] as const satisfies (keyof Tokens)[];

const MARKS: ReactNode[] = [
  null,
  <path d="M-1 1L1-1M0 8L8 0M7 9L9 7" />,
  <path d="M2 2h.01M6 6h.01" strokeLinecap="round" strokeWidth={1.8} />,
  <path d="M0 4H8" />,
  <path d="M-1 7L1 9M0 0L8 8M7-1L9 1" />,
  <path d="M4 0V8" />,
  <path d="M0 0L8 8M8 0L0 8" />,
];

/** The pattern of a part's territory: neighbours in the list differ in colour, and all in colour or marks. */
export function TerritoryPattern({ id, index, tokens }: { id: string; index: number; tokens: Tokens }) {
  const colour = tokens[COLOURS[index % COLOURS.length]];
  const marks = MARKS[(index + Math.floor(index / COLOURS.length)) % MARKS.length];
  return (
    <pattern id={id} width={8} height={8} patternUnits="userSpaceOnUse">
      <rect width={8} height={8} fill={tokens.sheet} />
      <rect width={8} height={8} fill={colour} opacity={0.2} />
      <g stroke={colour} strokeWidth={0.9} opacity={0.6} fill="none">
        {marks}
      </g>
    </pattern>
  );
}
