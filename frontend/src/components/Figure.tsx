import { splitQuantity, type QuantityKind } from '@roothertz/common/units';

interface FigureProps {
  /** In SI units; null = unknown. */
  value: number | null;
  kind: QuantityKind;
  digits?: number;
}

/** A value with its unit after a thin space, or the quiet word for what nobody knows. */
export function Figure({ value, kind, digits = 3 }: FigureProps) {
  if (value === null) return <Unknown />;
  const { number, unit } = splitQuantity(value, kind, { digits });
  return (
    <span style={{ whiteSpace: 'nowrap' }}>
      {number}
      {unit !== '' && `\u2009${unit}`}
    </span>
  );
}

export function Unknown() {
  return <span style={{ color: 'var(--muted)', fontStyle: 'italic' }}>unknown</span>;
}
