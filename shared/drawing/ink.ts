import type { ColourName } from '../wire-colours/colour-system.ts';
import { colourHex } from '../wire-colours/palette.ts';

/** Relative luminance of an sRGB colour (`#rrggbb`), as WCAG 2.2 defines it: 0 is black, 1 is white. */
export function luminance(hex: string): number {
  const channel = (at: number): number => {
    const part = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
}

/** Contrast of two sRGB colours, 1 to 21, as WCAG 2.2 defines it. */
export function contrast(one: string, other: string): number {
  const [dark = 0, light = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return (light + 0.05) / (dark + 0.05);
}

/** The wire palette's own black and white, for letters that stand on a wire's colour. */
const letterInks = [colourHex.black, colourHex.white] as const;

/** The ink that is read best on a wire's colour. */
export function letterInk(colour: ColourName): string {
  const ground = colourHex[colour];
  return contrast(ground, letterInks[0]) >= contrast(ground, letterInks[1]) ? letterInks[0] : letterInks[1];
}
