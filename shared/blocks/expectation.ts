/** What a check should read. `lowest` and `highest` are in the unit as written; null is open. */
export type Expectation =
  | {
      readonly kind: 'range';
      readonly lowest: number | null;
      readonly highest: number | null;
      /** False for `<` and `>`. */
      readonly lowestIncluded: boolean;
      readonly highestIncluded: boolean;
      readonly unit: string;
    }
  | { readonly kind: 'continuity' }
  | { readonly kind: 'open' };
