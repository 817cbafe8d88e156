import type { TextMark } from './display-list';

/**
 * Advance widths of Inter 4.1 in thousandths of the type size, U+0020 to U+007E, then the signs the drawings use.
 * Measured with canvas measureText at 1000 px in Chromium, from the files of @fontsource/inter 5.3.0.
 */
const WIDTHS = {
  400: [
    281, 288, 466, 633, 642, 982, 644, 300, 365, 365, 501, 662, 288, 460, 288, 360, 631, 407, 610,
    618, 646, 593, 620, 566, 619, 620, 288, 302, 662, 662, 662, 511, 966, 690, 654, 730, 722, 601,
    590, 746, 743, 269, 571, 672, 565, 903, 753, 765, 639, 765, 644, 642, 646, 744, 690, 985, 682,
    679, 629, 365, 360, 365, 471, 456, 323, 562, 612, 571, 612, 583, 370, 613, 591, 242, 242, 549,
    242, 876, 591, 600, 612, 612, 376, 528, 327, 591, 562, 818, 546, 562, 552, 426, 333, 426, 662,
  ],
  600: [
    252, 321, 523, 644, 650, 1004, 663, 326, 373, 373, 540, 673, 319, 465, 319, 379, 660, 423, 623,
    636, 666, 612, 640, 576, 640, 640, 319, 329, 673, 673, 673, 543, 999, 728, 659, 737, 722, 605,
    588, 749, 746, 277, 580, 703, 565, 922, 759, 769, 645, 773, 652, 650, 660, 736, 728, 1020, 720,
    713, 652, 373, 379, 373, 481, 469, 351, 574, 624, 583, 624, 591, 389, 625, 612, 262, 262, 569,
    262, 900, 612, 609, 624, 624, 397, 549, 353, 612, 587, 839, 569, 588, 566, 455, 359, 455, 673,
  ],
} as const;

const FIRST = 0x20;
const SIGNS: Record<string, Record<400 | 600, number>> = {
  '°': { 400: 456, 600: 458 },
  '½': { 400: 847, 600: 870 },
  '¼': { 400: 802, 600: 831 },
  '¾': { 400: 882, 600: 907 },
  '·': { 400: 288, 600: 319 },
  '×': { 400: 662, 600: 673 },
  '′': { 400: 223, 600: 257 },
  '″': { 400: 442, 600: 512 },
  '⁄': { 400: 192, 600: 205 },
  '…': { 400: 864, 600: 956 },
  '↑': { 400: 834, 600: 881 },
  '↓': { 400: 834, 600: 881 },
  '−': { 400: 662, 600: 673 },
};
/** What no entry covers: as wide as the widest Latin letter, so that a guess never overlaps. */
const WIDEST = 1013;

/**
 * How wide a text comes out, px. Kerning is left out; it only ever narrows the labels here.
 *
 * @example textWidth('90°', 12.5, 600) // 21.8
 */
export function textWidth(text: string, size: number, weight: 400 | 600): number {
  let thousandths = 0;
  for (const character of text) {
    const code = character.codePointAt(0) ?? 0;
    thousandths += WIDTHS[weight][code - FIRST] ?? SIGNS[character]?.[weight] ?? WIDEST;
  }
  return (thousandths * size) / 1000;
}

/** The stretch of its row a text takes, px. */
export function textExtent(mark: Pick<TextMark, 'x' | 'text' | 'size' | 'weight' | 'anchor'>): {
  left: number;
  right: number;
} {
  const width = textWidth(mark.text, mark.size, mark.weight);
  const before = { start: 0, middle: width / 2, end: width }[mark.anchor];
  return { left: mark.x - before, right: mark.x - before + width };
}

/** The text cut to a width with an ellipsis; null where not even two letters of it fit. */
export function fitText(
  text: string,
  width: number,
  size: number,
  weight: 400 | 600,
): string | null {
  if (textWidth(text, size, weight) <= width) return text;
  const letters = [...text];
  for (let kept = letters.length - 1; kept >= 2; kept -= 1) {
    const cut = `${letters.slice(0, kept).join('').trimEnd()}…`;
    if (textWidth(cut, size, weight) <= width) return cut;
  }
  return null;
}
