/** The kinds of page, in the order in which a subject lists them. */
export const pageKinds = ['overview', 'pinouts', 'quirks', 'safe-mods', 'checks', 'notes'] as const;

/** What kind of page it is. */
export type PageKind = (typeof pageKinds)[number];

/** The kinds as a reader sees them. */
export const pageKindLabels: Readonly<Record<PageKind, string>> = {
  overview: 'Overview',
  pinouts: 'Pinouts',
  quirks: 'Quirks',
  'safe-mods': 'Safe modifications',
  checks: 'Checks',
  notes: 'Notes',
};
