/** One point of a line; y is null where there is nothing to draw and the line breaks. */
export interface TrendPoint {
  readonly x: number;
  readonly y: number | null;
}

export interface Extent {
  readonly min: number;
  readonly max: number;
}

/** Where a value lies in a plot of this height, 0 at the top. */
export function plotY(value: number, extent: Extent, height: number): number {
  const share = (value - extent.min) / (extent.max - extent.min || 1);
  return Math.round((1 - share) * height * 10) / 10;
}

/** Path data of a line through the points, broken where y is null; a lone point becomes a short dash. */
export function plotLine(
  points: readonly TrendPoint[],
  x: Extent,
  y: Extent,
  width: number,
  height: number,
): string {
  const across = (value: number) => Math.round(((value - x.min) / (x.max - x.min || 1)) * width * 10) / 10;
  let open = false;
  return points
    .map((point, k) => {
      if (point.y === null) {
        open = false;
        return '';
      }
      const here = `${across(point.x)} ${plotY(point.y, y, height)}`;
      const alone = !open && (points[k + 1]?.y ?? null) === null;
      const part = alone ? `M${here}h4` : `${open ? 'L' : 'M'}${here}`;
      open = true;
      return part;
    })
    .join('');
}
