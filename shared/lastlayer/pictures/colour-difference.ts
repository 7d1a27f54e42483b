/** How different two shades look: colour-vision deficiency, CIELAB and CIEDE2000. */

type Triple = readonly [number, number, number];
export type Lab = Triple;
type Matrix = readonly [Triple, Triple, Triple];

/** Normal colour vision, or without the long-, middle- or short-wave cones. */
export const VISIONS = ['normal', 'protan', 'deutan', 'tritan'] as const;
export type Vision = (typeof VISIONS)[number];

/**
 * Simulation matrices for linear RGB at severity 1.0: Machado, Oliveira and Fernandes, "A
 * Physiologically-based Model for Simulation of Color Vision Deficiency", IEEE TVCG 15(6), 2009, table.
 */
const MACHADO: Readonly<Record<Vision, Matrix>> = {
  normal: [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ],
  protan: [
    [0.152286, 1.052583, -0.204868],
    [0.114503, 0.786281, 0.099216],
    [-0.003882, -0.048116, 1.051998],
  ],
  deutan: [
    [0.367322, 0.860646, -0.227968],
    [0.280085, 0.672501, 0.047413],
    [-0.01182, 0.04294, 0.968881],
  ],
  tritan: [
    [1.255528, -0.076749, -0.178779],
    [-0.078411, 0.930809, 0.147602],
    [0.004733, 0.691367, 0.3039],
  ],
};

/** Linear sRGB to CIE XYZ, D65 (IEC 61966-2-1). */
const TO_XYZ: Matrix = [
  [0.4124564, 0.3575761, 0.1804375],
  [0.2126729, 0.7151522, 0.072175],
  [0.0193339, 0.119192, 0.9503041],
];
/** White point D65. */
const WHITE: Triple = [0.95047, 1, 1.08883];

function times(matrix: Matrix, v: Triple): Triple {
  const row = (r: Triple) => r[0] * v[0] + r[1] * v[1] + r[2] * v[2];
  return [row(matrix[0]), row(matrix[1]), row(matrix[2])];
}

function each(v: Triple, f: (value: number, k: number) => number): Triple {
  return [f(v[0], 0), f(v[1], 1), f(v[2], 2)];
}

/** CIELAB (D65) of `#RRGGBB` as someone with this vision sees it. */
export function labOf(shade: string, vision: Vision): Lab {
  const value = Number.parseInt(shade.slice(1), 16);
  const linear = each([(value >> 16) & 255, (value >> 8) & 255, value & 255], (channel) => {
    const part = channel / 255;
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
  });
  const seen = each(times(MACHADO[vision], linear), (part) => Math.min(1, Math.max(0, part)));
  const [x, y, z] = each(times(TO_XYZ, seen), (part, k) => {
    const t = part / (WHITE[k] ?? 1);
    return t > 216 / 24389 ? Math.cbrt(t) : ((24389 / 27) * t + 16) / 116;
  });
  return [116 * y - 16, 500 * (x - y), 200 * (y - z)];
}

const rad = (degrees: number) => (degrees * Math.PI) / 180;

/** CIEDE2000, 0 for the same colour, with k = 1 (CIE 142-2001; formula as set out by Sharma, Wu and Dalal, 2005). */
export function deltaE2000([l1, a1, b1]: Lab, [l2, a2, b2]: Lab): number {
  const meanC = (Math.hypot(a1, b1) + Math.hypot(a2, b2)) / 2;
  const g = 0.5 * (1 - Math.sqrt(meanC ** 7 / (meanC ** 7 + 25 ** 7)));
  const [p1, p2] = [a1 * (1 + g), a2 * (1 + g)];
  const [c1, c2] = [Math.hypot(p1, b1), Math.hypot(p2, b2)];
  const hue = (a: number, b: number) =>
    a === 0 && b === 0 ? 0 : ((Math.atan2(b, a) * 180) / Math.PI + 360) % 360;
  const [h1, h2] = [hue(p1, b1), hue(p2, b2)];
  const grey = c1 * c2 === 0;
  let dh = grey ? 0 : h2 - h1;
  if (dh > 180) dh -= 360;
  if (dh < -180) dh += 360;
  const dL = l2 - l1;
  const dC = c2 - c1;
  const dH = 2 * Math.sqrt(c1 * c2) * Math.sin(rad(dh / 2));
  const meanL = (l1 + l2) / 2;
  const c = (c1 + c2) / 2;
  let h = h1 + h2;
  if (!grey) {
    if (Math.abs(h1 - h2) <= 180) h /= 2;
    else h = (h + (h < 360 ? 360 : -360)) / 2;
  }
  const t =
    1 -
    0.17 * Math.cos(rad(h - 30)) +
    0.24 * Math.cos(rad(2 * h)) +
    0.32 * Math.cos(rad(3 * h + 6)) -
    0.2 * Math.cos(rad(4 * h - 63));
  const sl = 1 + (0.015 * (meanL - 50) ** 2) / Math.sqrt(20 + (meanL - 50) ** 2);
  const sc = 1 + 0.045 * c;
  const sh = 1 + 0.015 * c * t;
  const rc = 2 * Math.sqrt(c ** 7 / (c ** 7 + 25 ** 7));
  const rt = -Math.sin(rad(60 * Math.exp(-(((h - 275) / 25) ** 2)))) * rc;
  const [x, y, z] = [dL / sl, dC / sc, dH / sh];
  return Math.sqrt(x * x + y * y + z * z + rt * y * z);
}
