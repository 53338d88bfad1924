import type { Curve, CurvePoint } from '../../components/charts/curve';

/** The three curves of every chart of the ranking: floor, compared part, selected part on top. */
export function threeCurves(
  floor: readonly CurvePoint[],
  compared: { name: string; points: readonly CurvePoint[] } | null,
  selected: { name: string; points: readonly CurvePoint[] },
): Curve[] {
  const curves: Curve[] = [{ name: 'source floor', points: floor, colour: 'slate', stroke: 'thick' }];
  if (compared) curves.push({ ...compared, colour: 'verdigris', stroke: 'dashed' });
  curves.push({ ...selected, colour: 'damson', stroke: 'solid' });
  return curves;
}
