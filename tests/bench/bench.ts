import { firstPaintRows } from './first-paint-bench.ts';
import { growthRows } from './growth-bench.ts';
import { quickPace, usualPace, type Pace } from './pace.ts';
import { pageThreadRows } from './page-thread-bench.ts';
import { parsingRows } from './parsing-bench.ts';
import { pauseRows } from './pause-bench.ts';
import { machineWords, tableText } from './print-table.ts';
import { publishingRows } from './publishing-bench.ts';
import { renderingRows } from './rendering-bench.ts';
import type { BenchRow } from './row.ts';
import { searchRows } from './search-bench.ts';
import { servingRows } from './serving-bench.ts';
import { weightRows } from './weight-bench.ts';

/** What is measured, by the names that `--only` takes. */
const groups: Readonly<Record<string, (pace: Pace) => Promise<BenchRow[]>>> = {
  serving: servingRows,
  rendering: renderingRows,
  parsing: parsingRows,
  publishing: publishingRows,
  growth: growthRows,
  search: searchRows,
  weight: weightRows,
  'first-paint': firstPaintRows,
  'page-thread': pageThreadRows,
  pauses: pauseRows,
};

/** The groups that were asked for: all, or those after `--only`, parted by commas. */
function askedGroups(options: readonly string[]): (readonly [string, (pace: Pace) => Promise<BenchRow[]>])[] {
  const at = options.indexOf('--only');
  if (at < 0) return Object.entries(groups);
  return (options[at + 1] ?? '').split(',').map((name) => {
    const group = groups[name];
    if (group === undefined) throw new Error(`There is no ${name}; there are ${Object.keys(groups).join(', ')}.`);
    return [name, group] as const;
  });
}

/** Measures everything that was asked for; what cannot be measured is said, and does not stop the rest. */
async function bench(options: readonly string[]): Promise<number> {
  const pace = options.includes('--quick') ? quickPace : usualPace;
  const rows: BenchRow[] = [];
  const failures: string[] = [];
  for (const [name, measure] of askedGroups(options)) {
    const start = performance.now();
    try {
      rows.push(...(await measure(pace)));
      console.error(`measured ${name} in ${((performance.now() - start) / 1000).toFixed(0)} s`);
    } catch (failure) {
      const stack = failure instanceof Error ? (failure.stack ?? failure.message) : String(failure);
      const said = stack.replaceAll(process.cwd(), '.');
      failures.push(`${name}: ${said.split('\n', 1)[0] ?? ''}`);
      console.error(said);
    }
  }
  console.log(`\nMeasured on ${machineWords()}${options.includes('--quick') ? ', quickly' : ''}.\n`);
  console.log(tableText(rows));
  for (const failure of failures) console.log(`Could not be measured: ${failure}`);
  return failures.length === 0 ? 0 : 1;
}

// Ends what a measurement that failed half-way may have left open.
process.exit(await bench(process.argv.slice(2)));
