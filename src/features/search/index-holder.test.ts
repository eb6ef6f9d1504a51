import { describe, expect, test } from 'vitest';
import { emptyBench } from '../../lib/bench.ts';
import { buildLinesFile } from '../../../shared/search/lines-file.ts';
import { buildProseFile } from '../../../shared/search/prose-file.ts';
import type { SearchDocument } from '../../../shared/search/search-document.ts';
import { createIndexHolder } from './index-holder.ts';

function documentWith(text: string): SearchDocument {
  return {
    address: { shelf: 'donors', subject: 'testbike', page: 'quirks' },
    subjectTitle: 'Testbike 100',
    title: 'Quirks',
    kind: 'quirks',
    summary: 'What it does.',
    hazards: [],
    holders: [
      {
        kind: 'components',
        id: '',
        name: '',
        zone: '',
        face: null,
        lines: [
          {
            address: 'horn',
            own: 'horn',
            text: 'Horn',
            detail: 'load, 30 W',
            colour: null,
            size: null,
            goesTo: [],
            applies: { years: [], markets: [], frames: [] },
            cited: false,
            state: 'plain',
            hazard: null,
          },
        ],
      },
    ],
    sections: [{ id: 's-noises', heading: 'Noises', text }],
  };
}

/** A holder on files of its own, which says after each step what it holds. */
function openHolder(files: Record<string, unknown>) {
  const held: string[] = [];
  const fetched: string[] = [];
  const holder = createIndexHolder({
    fetchFile(name) {
      fetched.push(name);
      return name in files
        ? Promise.resolve(JSON.parse(JSON.stringify(files[name])))
        : Promise.reject(new Error(`no ${name}`));
    },
    breathe: () => Promise.resolve(),
    onHeld: (lines, prose) => held.push(`${lines ?? '–'} ${prose ?? '–'}`),
  });
  const titlesFor = (query: string): string[] | null =>
    holder.ask({ query, bench: emptyBench })?.hits.map(({ kind, title }) => `${kind} ${title}`) ?? null;
  return { holder, held, fetched, titlesFor };
}

const first = documentWith('A hum means a wasp.');
const second = documentWith('A rattle means a loose bolt.');
const files = {
  'lines-1': buildLinesFile([first]),
  'prose-1': buildProseFile([first]),
  'lines-2': buildLinesFile([second]),
  'prose-2': buildProseFile([second]),
  'lines-of-tomorrow': { ...buildLinesFile([first]), version: 999 },
};

describe('the index in the browser', () => {
  test('has no answer before its lines are there', () => {
    expect(openHolder(files).titlesFor('horn')).toBeNull();
  });

  test('comes in the order of use: lines, titles and headings, then prose', async () => {
    const { holder, held, fetched, titlesFor } = openHolder(files);
    await holder.load({ lines: 'lines-1', prose: 'prose-1' });
    expect(held).toEqual(['lines-1 –', 'lines-1 –', 'lines-1 prose-1']);
    expect(fetched).toEqual(['lines-1', 'prose-1']);
    expect(titlesFor('horn')).toEqual(['line Horn: load, 30 W']);
    expect(titlesFor('wasp ')).toEqual(['section Noises']);
  });

  test('answers lines and headings while the prose cannot be had', async () => {
    const { holder, titlesFor } = openHolder({ 'lines-1': files['lines-1'] });
    await expect(holder.load({ lines: 'lines-1', prose: 'prose-1' })).rejects.toThrow('no prose-1');
    expect(titlesFor('horn')).toEqual(['line Horn: load, 30 W']);
    expect(titlesFor('noises ')).toEqual(['section Noises', 'page Quirks']);
    expect(titlesFor('wasp ')).toEqual([]);
  });

  test('forgets what was replaced when other files are named', async () => {
    const { holder, fetched, titlesFor } = openHolder(files);
    await holder.load({ lines: 'lines-1', prose: 'prose-1' });
    await holder.load({ lines: 'lines-2', prose: 'prose-2' });
    expect(titlesFor('wasp ')).toEqual([]);
    expect(titlesFor('rattle ')).toEqual(['section Noises']);
    await holder.load({ lines: 'lines-2', prose: 'prose-1' });
    expect(fetched.filter((name) => name === 'lines-2')).toHaveLength(1);
  });

  test('lets a newer load overtake an older one', async () => {
    const { holder, titlesFor } = openHolder(files);
    await Promise.all([
      holder.load({ lines: 'lines-1', prose: 'prose-1' }),
      holder.load({ lines: 'lines-2', prose: 'prose-2' }),
    ]);
    expect(titlesFor('rattle ')).toEqual(['section Noises']);
    expect(titlesFor('wasp ')).toEqual([]);
  });

  test('refuses a file of another version rather than find nothing in it', async () => {
    const { holder } = openHolder(files);
    await expect(holder.load({ lines: 'lines-of-tomorrow', prose: 'prose-1' })).rejects.toThrow('another version');
  });
});
