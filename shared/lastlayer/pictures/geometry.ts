/** A point of the drawing. */
export type Point = readonly [x: number, y: number];

/** Carries a point of a face, in its own coordinates, into the drawing. Always affine. */
export type FaceMap = (a: number, b: number) => Point;

/** How far a quarter circle's control points lie along its tangents (usual cubic approximation). */
const KAPPA = 0.5523;

function at([x, y]: Point): string {
  return `${round(x)} ${round(y)}`;
}

/** One decimal, without a trailing zero or a minus before zero. */
function round(value: number): string {
  return String(Math.round(value * 10) / 10 + 0);
}

/** A closed polygon as path data. */
export function polygonPath(points: readonly Point[]): string {
  return `M${points.map(at).join('L')}Z`;
}

/**
 * A rectangle with rounded corners in face coordinates, carried into the drawing by the face's map:
 * the curves go through the map with their control points, so the rounding is foreshortened with the face.
 */
export function tilePath(map: FaceMap, a0: number, b0: number, a1: number, b1: number, r: number): string {
  const c = r * (1 - KAPPA);
  const line = (a: number, b: number) => `L${at(map(a, b))}`;
  const curve = (...p: [number, number, number, number, number, number]) =>
    `C${at(map(p[0], p[1]))} ${at(map(p[2], p[3]))} ${at(map(p[4], p[5]))}`;
  return [
    `M${at(map(a0 + r, b0))}`,
    line(a1 - r, b0),
    curve(a1 - c, b0, a1, b0 + c, a1, b0 + r),
    line(a1, b1 - r),
    curve(a1, b1 - c, a1 - c, b1, a1 - r, b1),
    line(a0 + r, b1),
    curve(a0 + c, b1, a0, b1 - c, a0, b1 - r),
    line(a0, b0 + r),
    curve(a0, b0 + c, a0 + c, b0, a0 + r, b0),
    'Z',
  ].join('');
}

/**
 * Diagonal hatching inside a rectangle of a face, as path data: lines rising to the right, `step` apart
 * along the lower edge, clipped to the rectangle. Drawn as lines, so a page full of pictures shares no ids.
 */
export function hatchPath(
  map: FaceMap,
  a0: number,
  b0: number,
  a1: number,
  b1: number,
  step: number,
): string {
  const width = a1 - a0;
  const height = b1 - b0;
  const lines: string[] = [];
  for (let s = step; s < width + height; s += step) {
    const fromA = Math.max(0, s - height);
    const toA = Math.min(width, s);
    if (toA - fromA < step / 4) continue;
    lines.push(`M${at(map(a0 + fromA, b0 + s - fromA))}L${at(map(a0 + toA, b0 + s - toA))}`);
  }
  return lines.join('');
}

const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Text made safe inside markup and quoted attributes. */
export function escapeMarkup(text: string): string {
  return text.replace(/[&<>"']/g, (sign) => ENTITIES[sign] ?? '');
}

/** The svg element around a drawing: named for assistive technology if it has a title, else hidden from it. */
export function svgElement(kind: string, viewBox: string, inner: string, title?: string): string {
  const name = title ? `role="img" aria-label="${escapeMarkup(title)}"` : 'aria-hidden="true"';
  return `<svg xmlns="http://www.w3.org/2000/svg" class="${kind}" viewBox="${viewBox}" ${name} focusable="false">${inner}</svg>`;
}
