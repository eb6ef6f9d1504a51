import type { ReactElement } from 'react';
import { readLayout } from '../../shared/blocks/read-layout.ts';
import type { FaceLayout } from '../../shared/blocks/face-layout.ts';

interface FaceThumbnailProps {
  readonly connector: { readonly cavities: number; readonly layout?: string | undefined };
}

const seat = 8;
const step = 11;
const edge = 5;
/** One scale for all, so that a large connector looks larger. */
const scale = 1.15;

/** A connector at the size of a thumb nail, known at a glance by its shape. Says nothing to a screen reader. */
export function FaceThumbnail({ connector }: FaceThumbnailProps): ReactElement {
  const layout = connector.layout === undefined ? null : readLayout(connector.layout);
  const plan = layout?.kind === 'ring' ? ringOf(layout.cavities) : rowsOf(layout ?? inRows(connector.cavities));
  return (
    <svg
      className="face-thumbnail"
      viewBox={`-1 -1 ${String(plan.width + 2)} ${String(plan.height + 2)}`}
      width={tenth(plan.width * scale)}
      height={tenth(plan.height * scale)}
      aria-hidden="true"
      focusable="false"
      fill="none"
      stroke="currentColor"
    >
      {plan.round ? (
        <circle cx={plan.width / 2} cy={plan.height / 2} r={plan.width / 2} strokeWidth="1.5" />
      ) : (
        <rect x="0" y="0" width={plan.width} height={plan.height} rx="1.5" strokeWidth="1.5" />
      )}
      {plan.seats.map(({ x, y }) => (
        <rect key={`${String(x)} ${String(y)}`} x={x} y={y} width={seat} height={seat} rx="1" strokeWidth="1" />
      ))}
    </svg>
  );
}

interface Plan {
  readonly round: boolean;
  readonly width: number;
  readonly height: number;
  readonly seats: readonly { readonly x: number; readonly y: number }[];
}

/** Rows stand in the middle over one another, as the face itself is drawn. */
function rowsOf(layout: FaceLayout): Plan {
  const rows = layout.kind === 'rows' ? layout.rows : [];
  const widest = Math.max(1, ...rows.map((row) => row.length));
  const seats = rows.flatMap((row, down) =>
    row.flatMap((isCavity, across) =>
      isCavity ? [{ x: edge + (across + (widest - row.length) / 2) * step, y: edge + down * step }] : [],
    ),
  );
  return { round: false, width: span(widest), height: span(rows.length), seats };
}

function span(count: number): number {
  return edge * 2 + (count - 1) * step + seat;
}

function ringOf(cavities: number): Plan {
  const radius = Math.max(9, (cavities * step) / (2 * Math.PI));
  const middle = radius + seat / 2 + edge;
  const seats = Array.from({ length: cavities }, (_, index) => {
    const turn = (index / cavities) * 2 * Math.PI;
    return {
      x: tenth(middle + radius * Math.sin(turn) - seat / 2),
      y: tenth(middle - radius * Math.cos(turn) - seat / 2),
    };
  });
  return { round: true, width: tenth(middle * 2), height: tenth(middle * 2), seats };
}

/** So many cavities where nobody has said how they lie: in one row, or in two. */
function inRows(cavities: number): FaceLayout {
  const columns = cavities <= 4 ? Math.max(1, cavities) : Math.ceil(cavities / 2);
  const rows = Array.from({ length: Math.ceil(Math.max(1, cavities) / columns) }, (_, down) =>
    Array.from({ length: Math.min(columns, cavities - down * columns) }, () => true),
  );
  return { kind: 'rows', rows };
}

function tenth(value: number): number {
  return Math.round(value * 10) / 10;
}
