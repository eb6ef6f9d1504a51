/** Every colour a wire can have in the systems that the book reads, in canonical words. */
export const colourNames = [
  'black',
  'white',
  'red',
  'yellow',
  'green',
  'blue',
  'brown',
  'orange',
  'grey',
  'violet',
  'pink',
  'light green',
  'light blue',
  'dark green',
  'chocolate',
  'turquoise',
  'gold',
  'silver',
  'clear',
] as const;

/** A colour in canonical words. Slate is `grey`, purple is `violet`, sky blue is `light blue`. */
export type ColourName = (typeof colourNames)[number];

/** The colour-code systems with published tables, and `own` for a page's own key. */
export const colourSystemNames = ['jis', 'din', 'bs-au7', 'iec', 'own'] as const;

/** The name of a colour-code system. */
export type ColourSystemName = (typeof colourSystemNames)[number];

/** A colour-code system; `own` carries the page's own key, code to colour. */
export type ColourSystem =
  | { readonly name: Exclude<ColourSystemName, 'own'> }
  | { readonly name: 'own'; readonly key: Readonly<Record<string, ColourName>> };

/** A wire's colours: base, and tracer where it has one. */
export interface WireColour {
  readonly base: ColourName;
  readonly tracer: ColourName | null;
}

/** What a written colour code turned out to be. */
export type ColourReading =
  | { readonly kind: 'read'; readonly colour: WireColour }
  | { readonly kind: 'ambiguous'; readonly colour: WireColour; readonly others: readonly WireColour[] }
  | { readonly kind: 'unknown' };
