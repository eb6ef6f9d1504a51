import type { FaceLayout } from './face-layout.ts';

/** The most cavities that a face may have; more is a slip of the pen. */
export const mostCavities = 200;

const longestWritten = 400;

/**
 * Reads a connector's layout: rows × columns (`2x3`), one row (`5`), cavities row by row (`3+4`), rows with gaps
 * (`xx.xx+xxxxx`), or a ring (`round 6`). Null where it is none of these or has no cavity or more than 200.
 */
export function readLayout(text: string): FaceLayout | null {
  if (text.length > longestWritten) return null;
  const plain = text
    .trim()
    .toLowerCase()
    .replace(/\s*([x×+.])\s*/g, '$1');
  const ring = /^round (\d{1,3})$/.exec(plain.replace(/\s+/g, ' '));
  if (ring !== null) {
    const cavities = Number(ring[1]);
    return cavities >= 1 && cavities <= mostCavities ? { kind: 'ring', cavities } : null;
  }
  const grid = /^(\d{1,3})[x×](\d{1,3})$/.exec(plain);
  const rows = grid === null ? readRows(plain) : gridRows(Number(grid[1]), Number(grid[2]));
  if (rows === null) return null;
  const layout: FaceLayout = { kind: 'rows', rows };
  const cavities = cavitiesIn(layout);
  return cavities >= 1 && cavities <= mostCavities ? layout : null;
}

function gridRows(rows: number, columns: number): readonly (readonly boolean[])[] | null {
  if (rows * columns > mostCavities) return null;
  return Array.from({ length: rows }, () => Array.from({ length: columns }, () => true));
}

function readRows(text: string): readonly (readonly boolean[])[] | null {
  const rows: (readonly boolean[])[] = [];
  for (const part of text.split('+')) {
    if (/^[1-9]\d{0,2}$/.test(part))
      rows.push(Array.from({ length: Math.min(Number(part), mostCavities + 1) }, () => true));
    else if (/^[x.]+$/.test(part) && part.length <= mostCavities) rows.push([...part].map((seat) => seat === 'x'));
    else return null;
  }
  return rows;
}

/** How many cavities a face has. */
export function cavitiesIn(layout: FaceLayout): number {
  if (layout.kind === 'ring') return layout.cavities;
  return layout.rows.reduce((sum, row) => sum + row.filter(Boolean).length, 0);
}
