import type { SwitchBlock, SwitchLine } from '../blocks/block.ts';
import { plainCell } from '../blocks/cell-text.ts';

/**
 * How a position's contacts are drawn as a chart: a class for each column (by its index in the table) that says whether
 * the bar between joined contacts reaches it from the left, goes on to the right, or only passes. Where several groups
 * would cross, none is drawn and their letters say it.
 */
export function joinsOf({ columns }: SwitchBlock, joined: SwitchLine['joined']): ReadonlyMap<number, string> {
  const classes = new Map<number, string>();
  const places = joined.map((group) =>
    columns.flatMap(({ role, heading }, at) => (role === 'contact' && group.includes(plainCell(heading)) ? [at] : [])),
  );
  const spans = places.map((group) => ({ group, from: Math.min(...group), to: Math.max(...group) }));
  const cross = spans.some((one) => spans.some((other) => one !== other && one.from < other.to && other.from < one.to));
  for (const { group, from, to } of spans) {
    for (let at = from; at <= to; at += 1) {
      if (columns[at]?.role !== 'contact') continue;
      const joins = group.includes(at) ? 'joined' : 'passed';
      if (cross) classes.set(at, group.includes(at) ? 'joined alone' : (classes.get(at) ?? ''));
      else classes.set(at, [joins, at > from ? 'from-left' : '', at < to ? 'to-right' : ''].filter((word) => word !== '').join(' '));
    }
  }
  return classes;
}
