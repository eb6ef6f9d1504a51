/** When something inside a unit joins: by the state of one of its terminals, or words that mean it may be either way. */
export type Condition =
  | { readonly kind: 'terminal'; readonly terminal: string; readonly at: 'earth' | 'live' | 'open' }
  | { readonly kind: 'words'; readonly words: string };
