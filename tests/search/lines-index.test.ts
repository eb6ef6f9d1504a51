import fc from 'fast-check';
import { beforeAll, describe, expect, test } from 'vitest';
import { formatPageAddress } from '../../shared/pages/address.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';
import { buildLinesFile } from '../../shared/search/lines-file.ts';
import { lineAddress, endsOf } from '../../shared/search/line-hit.ts';
import { openLinesIndex, textAt, type LinesIndex } from '../../shared/search/lines-index.ts';
import { createProseIndex, buildProseIndex } from '../../shared/search/prose-index.ts';
import { buildProseFile, prosePages } from '../../shared/search/prose-file.ts';
import { prosePageOf } from '../../shared/search/prose-page.ts';
import { queryLines } from '../../shared/search/query-lines.ts';
import { readQuery } from '../../shared/search/read-query.ts';
import {
  lineStates,
  type SearchDocument,
  type SearchHolder,
  type SearchLine,
} from '../../shared/search/search-document.ts';
import { searchDocumentOf } from '../../shared/search/search-document-of.ts';
import { search } from '../../shared/search/search.ts';
import { conceptsWithin } from '../../shared/search/concepts.ts';
import { plainWords } from '../../shared/search/words.ts';
import { makeCorpus } from '../bench/made-corpus.ts';
import { demoDocuments } from '../factories/demo-documents.ts';

interface Flat {
  readonly document: SearchDocument;
  readonly holder: SearchHolder;
  readonly line: SearchLine;
}

const corpora = ['demo', 'made'] as const;
type Corpus = (typeof corpora)[number];
const documents: Record<Corpus, SearchDocument[]> = { demo: [], made: [] };
const flat: Record<Corpus, Flat[]> = { demo: [], made: [] };
const indexes: Partial<Record<Corpus, LinesIndex>> = {};

beforeAll(() => {
  documents.demo = demoDocuments();
  documents.made = [...makeCorpus(60)].map(({ text }) => searchDocumentOf(text));
  for (const corpus of corpora) {
    flat[corpus] = documents[corpus].flatMap((document) =>
      document.holders.flatMap((holder) => holder.lines.map((line) => ({ document, holder, line }))),
    );
    indexes[corpus] = openLinesIndex(JSON.parse(JSON.stringify(buildLinesFile(documents[corpus]))));
  }
}, 120_000);

function indexOf(corpus: Corpus): LinesIndex {
  const index = indexes[corpus];
  if (index === undefined) throw new Error('not opened');
  return index;
}

/** The full addresses of all lines that answer. */
function found(corpus: Corpus, query: string): string[] {
  const index = indexOf(corpus);
  return queryLines(index, readQuery(query), { limit: 1_000_000 }).lines.map(({ line, holder }) => {
    const block = index.holders[holder];
    const page = block === undefined ? undefined : index.pages[block.page];
    if (block === undefined || page === undefined) throw new Error('a line without a page');
    return `${formatPageAddress(page.address)}#${lineAddress(index, block, line)}`;
  });
}

function addressOf({ document, line }: Flat): string {
  return `${formatPageAddress(document.address)}#${line.address}`;
}

describe.each(corpora)('the lines of the %s book', (corpus) => {
  test('come out of the file as they went in', () => {
    const index = indexOf(corpus);
    expect(index.count).toBe(flat[corpus].length);
    let at = 0;
    for (const { start, end, kind, id } of index.holders) {
      for (let line = start; line < end; line += 1) {
        const entry = flat[corpus][at];
        if (entry === undefined) throw new Error('a line too many');
        const holder = index.holders.find((one) => one.start <= line && line < one.end);
        if (holder === undefined) throw new Error('a line without a block');
        expect({
          kind,
          id,
          address: lineAddress(index, holder, line),
          own: index.names[index.own[line] ?? -1],
          text: textAt(index.texts, line),
          detail: textAt(index.details, line),
          colour: index.colours[index.colour[line] ?? 0] ?? null,
          size: textAt(index.sizes, line),
          goesTo: endsOf(index, line),
          applies: index.applicabilities[index.applies[line] ?? 0],
          cited: index.cited[line] === 1,
          state: lineStates[index.states[line] ?? 0],
          hazard: (index.hazard[line] ?? 0) - 1,
        }).toEqual({
          kind: entry.holder.kind,
          id: entry.holder.id,
          address: entry.line.address,
          own: entry.line.own,
          text: entry.line.text,
          detail: entry.line.detail,
          colour: entry.line.colour,
          size: entry.line.size ?? '',
          goesTo: entry.line.goesTo,
          applies: entry.line.applies,
          cited: entry.line.cited,
          state: entry.line.state,
          hazard: entry.line.hazard ?? -1,
        });
        at += 1;
      }
    }
  });

  test('with a colour are those that a naive look finds', () => {
    const coloured = flat[corpus].filter(({ line }) => line.colour !== null && line.colour.readings.length === 1);
    fc.assert(
      fc.property(fc.constantFrom(...coloured), ({ line }) => {
        const wanted = line.colour?.readings[0];
        if (wanted === undefined || wanted.tracer === null) return;
        const naive = flat[corpus].filter(({ line: other }) =>
          other.colour?.readings.some(({ base, tracer }) => base === wanted.base && tracer === wanted.tracer),
        );
        expect(found(corpus, `${wanted.base}, ${wanted.tracer} tracer `).sort()).toEqual(naive.map(addressOf).sort());
      }),
      { numRuns: 60 },
    );
  });

  test('with a word that has no other names are those that a naive look finds', () => {
    const texts = (entry: Flat): string[] =>
      [
        entry.document.subjectTitle,
        entry.document.address.subject,
        entry.document.title,
        entry.document.address.page,
        entry.holder.name,
        entry.holder.id,
        entry.holder.zone,
        entry.holder.kind === 'connector' ? '' : entry.line.own,
        entry.line.text,
        entry.line.detail,
        ...entry.line.goesTo.map(({ id }) => id),
      ].flatMap(plainWords);
    const words = [...new Set(flat[corpus].flatMap(({ line }) => plainWords(line.text)))].filter(
      (word) =>
        /^[a-z]{5,}$/.test(word) &&
        conceptsWithin([word]).length === 0 &&
        readQuery(`${word} `).terms[0]?.kind === 'word',
    );
    const subjects = new Set(
      documents[corpus].flatMap(({ subjectTitle, address }) => plainWords(`${subjectTitle} ${address.subject}`)),
    );
    const spoken = words.filter((word) => !subjects.has(word));
    fc.assert(
      fc.property(fc.constantFrom(...spoken), (word) => {
        const naive = flat[corpus].filter((entry) => texts(entry).includes(word));
        expect(found(corpus, `${word} `).sort()).toEqual(naive.map(addressOf).sort());
      }),
      { numRuns: 60 },
    );
  });

  test('asked for by their own address are first', () => {
    const addressed = flat[corpus].filter(({ holder, line }) => holder.kind === 'connector' && /^\d+$/.test(line.own));
    fc.assert(
      fc.property(fc.constantFrom(...addressed), ({ document, holder, line }) => {
        const index = indexOf(corpus);
        const [first] = queryLines(index, readQuery(`${holder.id}.${line.own}`), {
          bench: document.address.subject,
        }).lines;
        const block = first === undefined ? undefined : index.holders[first.holder];
        expect(block?.id).toBe(holder.id);
        expect(index.names[index.own[first?.line ?? -1] ?? -1]).toBe(line.own);
      }),
      { numRuns: 60 },
    );
  });

  test('are searched without throwing, whatever is typed, and never with another colour than was asked for', () => {
    const both = { lines: indexOf(corpus), prose: buildProseIndex(documents[corpus].slice(0, 12)) };
    const pieces = fc.constantFrom(
      'yellow',
      'Y/R',
      'red',
      'headlight',
      'haedlight',
      'pin',
      '3',
      '9',
      '.',
      'earth',
      'left',
      'fuse',
      '20',
      'a',
      'qf550',
      '~',
      '#',
      '2+',
      'neutrla',
      '1981',
      'UK',
      'zzz',
      'ø',
    );
    fc.assert(
      fc.property(fc.array(pieces, { maxLength: 7 }), fc.boolean(), (words, spaced) => {
        const query = words.join(spaced ? ' ' : '');
        const { hits } = search(both, query, { bench: 'torimachi-qf550', variant: anyVariant });
        const asked = readQuery(query).terms.filter((term) => term.kind === 'colour' && term.words.length === 0);
        for (const term of asked) {
          if (term.kind !== 'colour') continue;
          for (const { line } of hits) {
            if (line === null) continue;
            const said = line.colourWords ?? '';
            expect(
              term.colours.some(
                ({ base, tracer }) =>
                  (base === 'any' || said.includes(base)) &&
                  (tracer === 'any' || tracer === null || said.includes(tracer)),
              ),
              `${query}: ${said}`,
            ).toBe(true);
          }
        }
      }),
      { numRuns: 200 },
    );
  });

  test('and their prose are the same by way of the files as directly', () => {
    const index = indexOf(corpus);
    const file = JSON.parse(JSON.stringify(buildProseFile(documents[corpus])));
    expect(prosePages(index, file)).toEqual(documents[corpus].map(prosePageOf));
  });
});

test('a prose index takes a changed page in place of what it was', () => {
  const [document] = documents.made;
  if (document === undefined) throw new Error('no page');
  const index = createProseIndex();
  index.setPage(prosePageOf(document));
  const anchor = { id: 's-wasps', heading: 'Wasps', text: 'A wasp in the horn.' };
  index.setPage(prosePageOf({ ...document, sections: [anchor] }));
  expect(index.search(readQuery('wasp '), null, 10).sections.map(({ section }) => section)).toEqual([anchor]);
  const old = document.sections[0]?.heading ?? '';
  expect(
    index.search(readQuery(`${old} `), null, 10).sections.filter(({ section }) => section?.heading === old),
  ).toEqual([]);
  index.removePage(formatPageAddress(document.address));
  expect(index.search(readQuery('wasp '), null, 10).sections).toEqual([]);
  expect(index.size).toBe(0);
});
