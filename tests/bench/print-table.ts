import { availableParallelism, cpus } from 'node:os';
import { isMet, type BenchRow } from './row.ts';

const headings = ['what', 'beside', 'measured', 'yardstick', 'ratio', 'budget', 'met'];

function cellsOf(row: BenchRow): string[] {
  const { budget, ratio } = row;
  const sign = budget?.kind === 'at least' ? '≥' : '≤';
  return [
    row.what,
    row.beside,
    row.measured,
    row.yardstick,
    Number.isNaN(ratio) ? '–' : ratio.toFixed(2),
    budget === null ? '–' : `${sign} ${budget.ratio.toFixed(2)}`,
    budget === null ? '–' : isMet(row) ? 'yes' : 'NO',
  ];
}

/** Lays cells out in columns as wide as their widest cell, as a Markdown table. */
function layOut(rows: readonly (readonly string[])[]): string {
  const widths = headings.map((_, column) => Math.max(...rows.map((cells) => (cells[column] ?? '').length)));
  const line = (cells: readonly string[]): string =>
    `| ${cells.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join(' | ')} |`;
  const [first = [], ...rest] = rows;
  return [line(first), `| ${widths.map((width) => '-'.repeat(width)).join(' | ')} |`, ...rest.map(line)].join('\n');
}

/** Where the bench ran, as far as it matters to the figures. */
export function machineWords(): string {
  const model = cpus()[0]?.model.trim() ?? 'an unknown processor';
  return `${String(availableParallelism())} cores (${model}), Node ${process.versions.node}, ${process.platform} ${process.arch}`;
}

/** The whole table, and which budgets are met. */
export function tableText(rows: readonly BenchRow[]): string {
  const budgeted = rows.filter(({ budget }) => budget !== null);
  const missed = budgeted.filter((row) => !isMet(row));
  const verdict =
    missed.length === 0
      ? `All ${String(budgeted.length)} budgets are met.`
      : `${String(budgeted.length - missed.length)} of ${String(budgeted.length)} budgets are met. Not met:`;
  return [
    layOut([headings, ...rows.map(cellsOf)]),
    '',
    verdict,
    ...missed.map((row) => `- ${row.what}, beside ${row.beside}: ${row.ratio.toFixed(2)}`),
  ].join('\n');
}
