import { colourNames, type ColourName, type WireColour } from './colour-system.ts';

const otherWords: Readonly<Record<string, ColourName>> = {
  gray: 'grey',
  slate: 'grey',
  purple: 'violet',
  lilac: 'violet',
  rose: 'pink',
  'sky blue': 'light blue',
  'pale blue': 'light blue',
  'pale green': 'light green',
  lightgreen: 'light green',
  lightblue: 'light blue',
  darkgreen: 'dark green',
  skyblue: 'light blue',
  'lt green': 'light green',
  'lt blue': 'light blue',
  'dk green': 'dark green',
  'dark brown': 'chocolate',
  transparent: 'clear',
};

const byWord: ReadonlyMap<string, ColourName> = new Map([
  ...colourNames.map((name) => [name, name] as const),
  ...Object.entries(otherWords),
]);

/** The colour that an English word, or two of them, names; any case, US spelling too. Null where it names none. */
export function colourOfWords(words: string): ColourName | null {
  return byWord.get(words.trim().toLowerCase().replace(/\s+/g, ' ')) ?? null;
}

/** A wire's colour in words: `yellow, red tracer`, and `yellow` where it has no tracer. */
export function wireColourWords({ base, tracer }: WireColour): string {
  return tracer === null ? base : `${base}, ${tracer} tracer`;
}
