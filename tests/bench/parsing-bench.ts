import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import remarkDirective from 'remark-directive';
import remarkFrontmatter from 'remark-frontmatter';
import remarkGfm from 'remark-gfm';
import remarkParse from 'remark-parse';
import { unified } from 'unified';
import { readPage } from '../../shared/dialect/read-page.ts';
import { renderPage } from '../../shared/dialect/render-page.ts';
import type { PageAddress } from '../../shared/pages/address.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';
import { honestPage } from './honest-page.ts';
import type { Pace } from './pace.ts';
import type { BenchRow } from './row.ts';
import { kilobytes, milliseconds, sideBySide } from './side-by-side.ts';

const address: PageAddress = { shelf: 'donors', subject: 'measured', page: 'pinouts' };

/** The parser with the same extensions and nothing of ours. */
const plainParser = unified()
  .use(remarkParse)
  .use(remarkGfm)
  .use(remarkFrontmatter, ['yaml'])
  .use(remarkDirective)
  .freeze();

/** Blocks, findings and safe HTML of a text, as the parsing worker makes them. */
function readAndRender(markdown: string): string {
  const text = readPage(markdown);
  if (!text.ok) throw new Error(text.refusal.message);
  return renderPage(text.value, { address, variant: anyVariant, marks: 'shown' });
}

function demoTexts(): string[] {
  const folder = join(process.cwd(), 'content');
  const files = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((file) => file.endsWith('.md'));
  return files.sort().map((file) => readFileSync(join(folder, file), 'utf8'));
}

async function besideParser(pace: Pace, what: string, texts: readonly string[]): Promise<BenchRow> {
  const times = await sideBySide(
    pace,
    'processor',
    () => texts.map(readAndRender),
    () => texts.map((text) => plainParser.parse(text)),
  );
  return {
    what: `Markdown to safe HTML and blocks: ${what}`,
    beside: 'unified parsing the same text alone',
    measured: milliseconds(times.ours),
    yardstick: milliseconds(times.yardstick),
    ratio: 1 / times.timeRatio,
    budget: { kind: 'at least', ratio: 0.8 },
  };
}

/** Reading Markdown: beside the parser alone, and how it grows. */
export async function parsingRows(pace: Pace): Promise<BenchRow[]> {
  const demo = demoTexts();
  const small = honestPage(3);
  const [half, whole] = [honestPage(15), honestPage(30)];
  const growth = await sideBySide(
    pace,
    'processor',
    () => readAndRender(whole),
    () => readAndRender(half),
  );
  const size = (text: string): string => kilobytes(Buffer.byteLength(text));
  return [
    await besideParser(pace, `the demo's ${String(demo.length)} pages`, demo),
    await besideParser(pace, `a page of ${size(small)} with three tables`, [small]),
    {
      what: `Markdown to safe HTML and blocks: a page of ${size(whole)}`,
      beside: `its first half, ${size(half)}`,
      measured: milliseconds(growth.ours),
      yardstick: milliseconds(growth.yardstick),
      ratio: growth.timeRatio,
      budget: { kind: 'at most', ratio: 2.3 },
    },
  ];
}
