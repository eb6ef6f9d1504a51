/** A drawing as values: an SVG element with its attributes and what is inside. Both sides turn it into markup the same way. */
export interface Drawing {
  readonly tag: string;
  readonly attributes: Readonly<Record<string, string | number>>;
  readonly children: readonly (Drawing | string)[];
}
