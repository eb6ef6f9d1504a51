import type { Shelf } from '../../shared/pages/address.ts';
import type { SourceKind } from '../../shared/pages/front-matter.ts';

/** The shelves as a reader sees them. */
export const shelfLabels: Readonly<Record<Shelf, string>> = {
  donors: 'Donors',
  parts: 'Parts',
  reference: 'Reference',
};

/** What one subject of a shelf is called. */
export const subjectLabels: Readonly<Record<Shelf, string>> = {
  donors: 'Donor',
  parts: 'Part',
  reference: 'Topic',
};

/** What a source is, as a reader sees it. */
export const sourceLabels: Readonly<Record<SourceKind, string>> = {
  'factory-manual': 'Factory manual',
  'parts-list': 'Parts list',
  standard: 'Standard',
  'club-measurement': 'Measured in the club',
  'other-diagram': 'Another diagram',
  'word-of-mouth': 'Word of mouth',
};

/** `1 line`, `12 lines`, `1,204 lines`. */
export function counted(count: number, one: string, many = `${one}s`): string {
  return `${groupThousands(count)} ${count === 1 ? one : many}`;
}

function groupThousands(count: number): string {
  return String(count).replace(/\B(?=(?:\d{3})+$)/g, ',');
}
