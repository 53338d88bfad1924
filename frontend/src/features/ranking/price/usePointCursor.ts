import { useState, type KeyboardEvent, type MouseEvent, type PointerEvent } from 'react';
import { nearestPoint, PRICE_HEIGHT, PRICE_WIDTH, type PriceGeometry } from './priceGeometry';
import type { PricePoint } from './pricePlot';

const STEPS: Record<string, number> = { ArrowLeft: -1, ArrowDown: -1, ArrowRight: 1, ArrowUp: 1 };

/** The point that is looked at, by pointer or by arrow keys in the order of price; a click or Enter takes it. */
export function usePointCursor(
  points: readonly PricePoint[],
  geometry: PriceGeometry,
  selected: PricePoint | undefined,
  onTake: (id: string) => void,
) {
  const [cursorId, setCursor] = useState<string | null>(null);
  const cursor = points.find(({ id }) => id === cursorId);
  const under = (event: MouseEvent<HTMLElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    const x = ((event.clientX - box.left) * PRICE_WIDTH) / box.width;
    const y = ((event.clientY - box.top) * PRICE_HEIGHT) / box.height;
    return nearestPoint(points, geometry, x, y);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const step = STEPS[event.key];
    if (event.key === 'Escape') return setCursor(null);
    if (step === undefined && event.key !== 'Enter') return;
    event.preventDefault();
    if (step) setCursor(stepped(points, cursor ?? selected, step));
    else if (cursor) onTake(cursor.id);
  };
  return {
    cursor,
    handlers: {
      onKeyDown,
      onPointerMove: (event: PointerEvent<HTMLElement>) => setCursor(under(event)?.id ?? null),
      onPointerLeave: () => setCursor(null),
      onBlur: () => setCursor(null),
      onClick: (event: MouseEvent<HTMLElement>) => {
        const point = under(event);
        if (point) onTake(point.id);
      },
    },
  };
}

function stepped(points: readonly PricePoint[], from: PricePoint | undefined, step: number): string | null {
  const place = from === undefined ? (step > 0 ? 0 : points.length - 1) : points.indexOf(from) + step;
  return points[Math.min(points.length - 1, Math.max(0, place))]?.id ?? null;
}
