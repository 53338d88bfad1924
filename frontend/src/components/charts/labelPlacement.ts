import type { Curve, CurvePoint } from './curve';

/** A rectangle in pixels from the plot's lower left corner. */
interface Box {
  left: number;
  right: number;
  bottom: number;
  top: number;
}

export interface LabelPlace {
  coord: CurvePoint;
  align: 'left' | 'center' | 'right';
  verticalAlign: 'top' | 'bottom';
}

export interface PlotRange {
  x: [number, number];
  y: [number, number];
  /** Pixels. */
  width: number;
  height: number;
  /** Where a line stands across the x axis. */
  markAt?: number;
}

const CHARACTER = 6.6;
const LINE = 14;
export const LABEL_GAP = 4;
/** More room than this around a label is as good as this. */
const ENOUGH = 9;
const STEPS = 24;

/** Where each curve's label stands freest of all curves and of the labels before it. */
export function placeLabels(curves: readonly Curve[], range: PlotRange): (LabelPlace | null)[] {
  const lines = [...curves.flatMap(({ points }) => points), ...markPoints(range)].map((point) =>
    toPixels(point, range),
  );
  const taken: Box[] = [];
  return curves.map(({ name, points }) => {
    const best = candidatesOf(points, name.length * CHARACTER, range)
      .map((candidate) => ({ ...candidate, room: roomAround(candidate.box, lines, taken, range) }))
      .reduce<(Candidate & { room: number }) | null>(
        (one, other) => (one === null || other.room > one.room ? other : one),
        null,
      );
    if (best) taken.push(best.box);
    return best && best.place;
  });
}

function markPoints({ markAt, y: [from, to] }: PlotRange): CurvePoint[] {
  if (markAt === undefined) return [];
  return Array.from({ length: STEPS + 1 }, (_none, step) => [markAt, from * (to / from) ** (step / STEPS)]);
}

interface Candidate {
  place: LabelPlace;
  box: Box;
}

function candidatesOf(points: readonly CurvePoint[], width: number, range: PlotRange): Candidate[] {
  const every = Math.max(1, Math.floor(points.length / STEPS));
  return points
    .filter((_point, index) => index % every === 0)
    .flatMap((coord) =>
      (['bottom', 'top'] as const).flatMap((verticalAlign) =>
        (['center', 'right', 'left'] as const).map((align) => {
          const place = { coord, align, verticalAlign };
          return { place, box: boxOf(place, width, range) };
        }),
      ),
    );
}

function boxOf({ coord, align, verticalAlign }: LabelPlace, width: number, range: PlotRange): Box {
  const [x, y] = toPixels(coord, range);
  const left = x - { left: -LABEL_GAP, center: width / 2, right: width + LABEL_GAP }[align];
  const bottom = verticalAlign === 'bottom' ? y + LABEL_GAP : y - LABEL_GAP - LINE;
  return { left, right: left + width, bottom, top: bottom + LINE };
}

function toPixels([x, y]: CurvePoint, range: PlotRange): CurvePoint {
  const along = (value: number, [from, to]: [number, number]) => Math.log(value / from) / Math.log(to / from);
  return [along(x, range.x) * range.width, along(y, range.y) * range.height];
}

function roomAround(
  box: Box,
  points: readonly CurvePoint[],
  taken: readonly Box[],
  range: PlotRange,
): number {
  const outside = Math.min(box.left, range.width - box.right, box.bottom, range.height - box.top);
  if (outside < 0) return outside;
  const toPoints = points.map(([x, y]) => distance(box, { left: x, right: x, bottom: y, top: y }));
  const toLabels = taken.map((other) => distance(box, other));
  return Math.min(ENOUGH, ...toPoints, ...toLabels);
}

function distance(one: Box, other: Box): number {
  const dx = Math.max(0, one.left - other.right, other.left - one.right);
  const dy = Math.max(0, one.bottom - other.top, other.bottom - one.top);
  return Math.hypot(dx, dy);
}
