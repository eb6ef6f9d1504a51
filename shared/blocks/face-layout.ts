/**
 * The shape of a connector's face as seen from its own `seen` side, in reading order.
 * `rows`: each row is a list of seats from left to right, true for a cavity and false for a gap.
 * `ring`: so many cavities on a circle.
 */
export type FaceLayout =
  | { readonly kind: 'rows'; readonly rows: readonly (readonly boolean[])[] }
  | { readonly kind: 'ring'; readonly cavities: number };
