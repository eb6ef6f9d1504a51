import { brotliCompressSync, constants } from 'node:zlib';
import { buildLinesFile } from '../../shared/search/lines-file.ts';
import { openLinesIndex } from '../../shared/search/lines-index.ts';
import { buildProseFile } from '../../shared/search/prose-file.ts';
import { buildProseIndex } from '../../shared/search/prose-index.ts';
import { queryLines } from '../../shared/search/query-lines.ts';
import { readQuery } from '../../shared/search/read-query.ts';
import { searchDocumentOf } from '../../shared/search/search-document-of.ts';
import { search } from '../../shared/search/search.ts';
import { makeCorpus, usualPages } from './made-corpus.ts';
import type { Pace } from './pace.ts';
import { median, percentile, type BenchRow } from './row.ts';
import { kilobytes, milliseconds } from './side-by-side.ts';

const frameMilliseconds = 16;
const linesBudgetBytes = 100_000;
const titlesBudgetBytes = 60_000;
const firstAnswerShare = 0.15;
const twiceTheWork = 2.3;

/** What somebody types, a letter at a time; each beginning is one key press. */
const typedQueries = [
  'yellow red headlight',
  'Y/R headlight',
  'main beam left bar',
  'turn signal left earth',
  'headlight pin 3',
  'regulater output',
  'brake lamp blue',
  'kill switch feed',
  'charging battery volts',
  'corrosion terminal crimp',
];

function keyPresses(): string[] {
  return typedQueries.flatMap((query) => Array.from({ length: query.length }, (_, at) => query.slice(0, at + 1)));
}

/** Milliseconds that the processor worked for this program: what other programs do at the same time is not in it. */
function processorMilliseconds(work: () => unknown): number {
  const before = process.cpuUsage();
  work();
  const { user, system } = process.cpuUsage(before);
  return (user + system) / 1000;
}

/**
 * The 95th percentile of all key presses, each by the middle of its rounds: what differs is the key, not the moment. A
 * round before them warms up and does not count.
 */
function percentile95(rounds: number, work: (typed: string) => unknown): number {
  const presses = keyPresses();
  for (const typed of presses) work(typed);
  const times = presses.map((): number[] => []);
  for (let round = 0; round < rounds; round += 1) {
    presses.forEach((typed, at) => times[at]?.push(processorMilliseconds(() => work(typed))));
  }
  return percentile(times.map(median), 0.95);
}

/** As the server sends it. */
function compressedBytes(text: string): number {
  return brotliCompressSync(text, { params: { [constants.BROTLI_PARAM_QUALITY]: 9 } }).length;
}

/** What a key press costs over a book of 1,000 made pages, and what the index weighs. */
export async function searchRows(pace: Pace): Promise<BenchRow[]> {
  const pages = [...makeCorpus(usualPages)];
  const documents = pages.map(({ text }) => searchDocumentOf(text));
  const file = buildLinesFile(documents);
  const { lines, holders, hazards, ...titles } = file;
  const index = openLinesIndex(file);
  const indexes = { lines: index, prose: buildProseIndex(documents) };
  const more = openLinesIndex(
    buildLinesFile([...makeCorpus(usualPages * 2)].map(({ text }) => searchDocumentOf(text))),
  );

  const rounds = Math.max(3, Math.floor(pace.rounds / 2));
  const both = percentile95(rounds, (typed) => search(indexes, typed));
  const scan = percentile95(rounds, (typed) => queryLines(index, readQuery(typed)));
  const scanOfTwice = percentile95(rounds, (typed) => queryLines(more, readQuery(typed)));

  const linesBytes = compressedBytes(JSON.stringify({ lines, holders, hazards }));
  const titlesBytes = compressedBytes(JSON.stringify(titles));
  const firstBytes = compressedBytes(JSON.stringify(file));
  const proseBytes = compressedBytes(JSON.stringify(buildProseFile(documents)));
  const textBytes = compressedBytes(pages.map(({ markdown }) => markdown).join('\n'));
  const counted = `${usualPages.toLocaleString('en')} pages, ${index.count.toLocaleString('en')} lines`;
  return [
    {
      what: `key press to results, lines and prose with their drawings, ${counted}, p95`,
      beside: 'one frame (four times that on a phone)',
      measured: milliseconds(both),
      yardstick: milliseconds(frameMilliseconds),
      ratio: both / frameMilliseconds,
      budget: { kind: 'at most', ratio: 1 },
    },
    {
      what: `key press to lines found, ${counted}, p95`,
      beside: 'one frame',
      measured: milliseconds(scan),
      yardstick: milliseconds(frameMilliseconds),
      ratio: scan / frameMilliseconds,
      budget: null,
    },
    {
      what: `key press to lines found, ${more.count.toLocaleString('en')} lines, p95`,
      beside: 'the same over half as many',
      measured: milliseconds(scanOfTwice),
      yardstick: milliseconds(scan),
      ratio: scanOfTwice / scan,
      budget: { kind: 'at most', ratio: twiceTheWork },
    },
    {
      what: `index for the first answer, over the wire, ${counted}`,
      beside: "the pages' own text, compressed alike",
      measured: kilobytes(firstBytes),
      yardstick: kilobytes(textBytes),
      ratio: firstBytes / textBytes,
      budget: { kind: 'at most', ratio: firstAnswerShare },
    },
    {
      what: 'of it, lines',
      beside: '0.10 MB',
      measured: kilobytes(linesBytes),
      yardstick: kilobytes(linesBudgetBytes),
      ratio: linesBytes / linesBudgetBytes,
      budget: { kind: 'at most', ratio: 1 },
    },
    {
      what: 'of it, titles and headings',
      beside: '0.06 MB',
      measured: kilobytes(titlesBytes),
      yardstick: kilobytes(titlesBudgetBytes),
      ratio: titlesBytes / titlesBudgetBytes,
      budget: { kind: 'at most', ratio: 1 },
    },
    {
      what: 'prose, fetched after that in the background',
      beside: "the pages' own text, compressed alike",
      measured: kilobytes(proseBytes),
      yardstick: kilobytes(textBytes),
      ratio: proseBytes / textBytes,
      budget: null,
    },
  ];
}
