import type { ReactElement } from 'react';

interface ZoneThumbnailProps {
  readonly zones: readonly { readonly zone: string; readonly connectors: number }[];
}

/** A donor's connectors by zone, as a small drawing. */
export function ZoneThumbnail({ zones }: ZoneThumbnailProps): ReactElement {
  return <span className="zone-thumbnail">{zones.map(({ zone, connectors }) => `${zone} ${String(connectors)}`).join(', ')}</span>;
}
