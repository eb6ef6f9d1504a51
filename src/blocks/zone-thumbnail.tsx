import type { ReactElement } from 'react';
import { drawZoneCounts } from '../../shared/drawing/draw-thumbnails.ts';
import { drawingMarkup } from '../../shared/drawing/drawing.ts';

interface ZoneThumbnailProps {
  readonly zones: readonly { readonly zone: string; readonly connectors: number }[];
}

/** A donor's connectors by zone, as a small drawing with its words. */
export function ZoneThumbnail({ zones }: ZoneThumbnailProps): ReactElement {
  const words = zones.map(({ zone, connectors }) => `${zone} ${String(connectors)}`).join(', ');
  return (
    <>
      {/* Markup that our own drawing makes of numbers. */}
      <span className="zone-thumbnail" dangerouslySetInnerHTML={{ __html: drawingMarkup(drawZoneCounts(zones)) }} />
      <span className="heard">{words}</span>
    </>
  );
}
