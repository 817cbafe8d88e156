/** Colour arithmetic for the tests of the tokens. Colours are `#rrggbb`. */
export type Rgb = [number, number, number];

export function rgbOf(hex: string): Rgb {
  const digits = /^#([0-9a-f]{6})$/i.exec(hex)?.[1];
  if (!digits) throw new Error(`not a colour: ${hex}`);
  return [0, 2, 4].map((at) => parseInt(digits.slice(at, at + 2), 16) / 255) as Rgb;
}

/** sRGB transfer function, IEC 61966-2-1. */
const linear = (value: number): number =>
  value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;

function luminance(hex: string): number {
  const [red, green, blue] = rgbOf(hex).map(linear) as Rgb;
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

/** WCAG 2.2 contrast ratio, 1 to 21. */
export function contrast(one: string, other: string): number {
  const [light, dark] = [luminance(one), luminance(other)].sort((a, b) => b - a) as [
    number,
    number,
  ];
  return (light + 0.05) / (dark + 0.05);
}

type Matrix = [Rgb, Rgb, Rgb];

/** Machado, Oliveira and Fernandes 2009, "A physiologically-based model …", table 1, severity 1.0; linear RGB. */
const VISION: Record<'protan' | 'deutan' | 'tritan', Matrix> = {
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
export const EYES = ['normal', 'protan', 'deutan', 'tritan', 'grey'] as const;
export type Eye = (typeof EYES)[number];

function seenBy(hex: string, eye: Eye): Rgb {
  const rgb = rgbOf(hex).map(linear) as Rgb;
  if (eye === 'normal') return rgb;
  if (eye === 'grey') {
    const grey = luminance(hex);
    return [grey, grey, grey];
  }
  return VISION[eye].map((row) =>
    Math.min(1, Math.max(0, row[0] * rgb[0] + row[1] * rgb[1] + row[2] * rgb[2])),
  ) as Rgb;
}

/** CIE Lab under D65, from linear sRGB. */
function labOf([red, green, blue]: Rgb): Rgb {
  const scaled = [
    (0.4124564 * red + 0.3575761 * green + 0.1804375 * blue) / 0.95047,
    0.2126729 * red + 0.7151522 * green + 0.072175 * blue,
    (0.0193339 * red + 0.119192 * green + 0.9503041 * blue) / 1.08883,
  ].map((value) =>
    value > 216 / 24389 ? Math.cbrt(value) : (24389 / 27) * (value / 116) + 16 / 116,
  );
  const [x, y, z] = scaled as Rgb;
  return [116 * y - 16, 500 * (x - y), 200 * (y - z)];
}

const radians = (degrees: number): number => (degrees * Math.PI) / 180;
const hueOf = (b: number, a: number): number => {
  const degrees = (Math.atan2(b, a) * 180) / Math.PI;
  return degrees < 0 ? degrees + 360 : degrees;
};

/** CIEDE2000 of two Lab colours; Sharma, Wu and Dalal 2005. */
export function difference2000([l1, a1, b1]: Rgb, [l2, a2, b2]: Rgb): number {
  const meanC = (Math.hypot(a1, b1) + Math.hypot(a2, b2)) / 2;
  const g = 0.5 * (1 - Math.sqrt(meanC ** 7 / (meanC ** 7 + 25 ** 7)));
  const [ap1, ap2] = [a1 * (1 + g), a2 * (1 + g)];
  const [c1, c2] = [Math.hypot(ap1, b1), Math.hypot(ap2, b2)];
  const [h1, h2] = [c1 === 0 ? 0 : hueOf(b1, ap1), c2 === 0 ? 0 : hueOf(b2, ap2)];
  const turn = c1 * c2 === 0 ? 0 : ((((h2 - h1 + 180) % 360) + 360) % 360) - 180;
  const dH = 2 * Math.sqrt(c1 * c2) * Math.sin(radians(turn) / 2);
  const meanL = (l1 + l2) / 2;
  const meanCp = (c1 + c2) / 2;
  const sum = h1 + h2;
  const meanH =
    c1 * c2 === 0
      ? sum
      : Math.abs(h1 - h2) <= 180
        ? sum / 2
        : (sum < 360 ? sum + 360 : sum - 360) / 2;
  const t =
    1 -
    0.17 * Math.cos(radians(meanH - 30)) +
    0.24 * Math.cos(radians(2 * meanH)) +
    0.32 * Math.cos(radians(3 * meanH + 6)) -
    0.2 * Math.cos(radians(4 * meanH - 63));
  const sL = 1 + (0.015 * (meanL - 50) ** 2) / Math.sqrt(20 + (meanL - 50) ** 2);
  const sC = 1 + 0.045 * meanCp;
  const sH = 1 + 0.015 * meanCp * t;
  const rT =
    -2 *
    Math.sqrt(meanCp ** 7 / (meanCp ** 7 + 25 ** 7)) *
    Math.sin(radians(60 * Math.exp(-(((meanH - 275) / 25) ** 2))));
  const [dL, dC, dh] = [(l2 - l1) / sL, (c2 - c1) / sC, dH / sH];
  return Math.sqrt(dL ** 2 + dC ** 2 + dh ** 2 + rT * dC * dh);
}

/** How far apart two colours look to an eye. */
export const difference = (one: string, other: string, eye: Eye): number =>
  difference2000(labOf(seenBy(one, eye)), labOf(seenBy(other, eye)));
