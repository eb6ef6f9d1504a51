import type { ReactElement } from 'react';

interface FaceThumbnailProps {
  readonly connector: { readonly cavities: number };
}

/** A connector at the size of a thumb nail: its plate and as many cavities as it has. */
export function FaceThumbnail({ connector }: FaceThumbnailProps): ReactElement {
  const count = Math.max(1, Math.min(connector.cavities, 40));
  const columns = count <= 4 ? count : Math.ceil(count / 2);
  const rows = Math.ceil(count / columns);
  const step = 9;
  const width = columns * step + 5;
  const height = rows * step + 5;
  return (
    <svg className="face-thumbnail" viewBox={`-1 -1 ${String(width + 2)} ${String(height + 2)}`} aria-hidden="true" focusable="false">
      <rect x="0" y="0" width={width} height={height} fill="none" stroke="currentColor" strokeWidth="1.5" />
      {Array.from({ length: count }, (_, index) => (
        <rect
          key={index}
          x={4 + (index % columns) * step}
          y={4 + Math.floor(index / columns) * step}
          width="6"
          height="6"
          fill="none"
          stroke="currentColor"
          strokeWidth="1"
        />
      ))}
    </svg>
  );
}
