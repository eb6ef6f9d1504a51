import type { ColourName } from './colour-system.ts';

/**
 * How each wire colour is drawn, as sRGB; chosen for this book so that neighbours can be told apart on paper and on
 * dark. Used for nothing but wires, always with an outline, letters and words. `clear` is the cable's own pale plastic.
 */
export const colourHex: Readonly<Record<ColourName, string>> = {
  black: '#17181A',
  white: '#FBFBF6',
  red: '#C8202B',
  yellow: '#F4CE1B',
  green: '#1E8044',
  blue: '#2256B4',
  brown: '#7A4A24',
  orange: '#EE7A1B',
  grey: '#8A9098',
  violet: '#73399B',
  pink: '#F29DB8',
  'light green': '#93D36A',
  'light blue': '#7FC4EA',
  'dark green': '#0F4A2B',
  chocolate: '#43261A',
  turquoise: '#1FA9A5',
  gold: '#B98F2E',
  silver: '#C3C8CC',
  clear: '#E9E4D2',
};
