import { shortened } from '../lib/quoted.ts';
import { colourOfWords } from '../wire-colours/colour-words.ts';
import { colourSystemNames, type ColourName, type ColourSystem } from '../wire-colours/colour-system.ts';
import type { Applicability } from './applicability.ts';
import { appliesToAll } from './applicability.ts';
import { finding, type Finding } from './finding.ts';
import {
  sourceKinds,
  wireStandards,
  type FrontMatter,
  type Source,
  type SubjectFacts,
  type WireStandard,
} from './front-matter.ts';
import { pageKinds, type PageKind } from './page-kind.ts';
import { readApplicability } from './read-applicability.ts';
import { isFields, readFields, type Fields } from './yaml-fields.ts';

/** What a page without front matter has: no title, notes, Japanese letters. */
export const emptyFrontMatter: FrontMatter = {
  title: '',
  kind: 'notes',
  summary: '',
  applies: appliesToAll,
  colours: { name: 'jis' },
  wireStandard: 'jis',
  sources: [],
  facts: {
    maker: null,
    model: null,
    years: null,
    markets: [],
    voltage: null,
    ignition: null,
    charging: null,
    battery: null,
    earth: null,
  },
};

/** Front matter as read, with a finding for every field that could not be. */
export interface FrontMatterReading {
  readonly frontMatter: FrontMatter;
  readonly findings: readonly Finding[];
}

/**
 * Reads a page's front matter.
 * @param yaml the text between the two lines of hyphens
 * @param firstLine the page's line on which that text begins, counted from 1
 * Never throws: what cannot be read has its default and a `block-unreadable` finding that says what was expected.
 */
export function readFrontMatter(yaml: string, firstLine: number): FrontMatterReading {
  const { fields, lines, problem } = readFields(yaml);
  const reader = new FieldReader(fields ?? {}, lines, firstLine);
  const frontMatter = reader.read();
  // Where the YAML itself is wrong, its fields are wrong because of that: one finding is enough.
  if (problem !== null) {
    const message = `The front matter cannot be read. ${problem.message} ${fieldsExpected}, and put a value that has a colon in quotes.`;
    return { frontMatter, findings: [finding('block-unreadable', message, firstLine + problem.line)] };
  }
  if (fields === null) {
    const message = `The front matter is no list of fields. ${fieldsExpected}.`;
    return { frontMatter, findings: [finding('block-unreadable', message, firstLine)] };
  }
  return { frontMatter, findings: reader.findings };
}

const fieldsExpected = 'Write one field a line as `name: value`';

/** Reads field after field and gathers what could not be read. */
class FieldReader {
  readonly findings: Finding[] = [];
  readonly #fields: Fields;
  readonly #lines: ReadonlyMap<string, number>;
  readonly #firstLine: number;

  constructor(fields: Fields, lines: ReadonlyMap<string, number>, firstLine: number) {
    this.#fields = fields;
    this.#lines = lines;
    this.#firstLine = firstLine;
  }

  read(): FrontMatter {
    return {
      title: this.#text('title') ?? '',
      kind: this.#oneOf<PageKind>('kind', pageKinds) ?? 'notes',
      summary: this.#text('summary') ?? '',
      applies: this.#applies(),
      colours: this.#colours(),
      wireStandard: this.#oneOf<WireStandard>('wire-standard', wireStandards) ?? 'jis',
      sources: this.#sources(),
      facts: this.#facts(),
    };
  }

  #complain(field: string, message: string): void {
    const line = this.#firstLine + (this.#lines.get(field) ?? 0);
    this.findings.push(finding('block-unreadable', message, line));
  }

  #text(field: string): string | null {
    const text = textOf(this.#fields[field]);
    if (text === undefined)
      this.#complain(field, `In the front matter \`${field}\` should be words, not a list or fields.`);
    return text ?? null;
  }

  #oneOf<Name extends string>(field: string, names: readonly Name[]): Name | null {
    const text = this.#text(field);
    if (text === null) return null;
    const found = names.find((name) => name === text.toLowerCase());
    if (found === undefined) {
      this.#complain(
        field,
        `In the front matter \`${field}: ${shortened(text)}\` is not known. Write one of ${names.join(', ')}.`,
      );
    }
    return found ?? null;
  }

  #names(field: string, value: unknown): string | null {
    if (!Array.isArray(value)) {
      const text = textOf(value);
      if (text === undefined)
        this.#complain(field, `In the front matter \`${field}\` should be names with commas between them.`);
      return text ?? null;
    }
    return value.map((entry: unknown) => textOf(entry) ?? '').join(',');
  }

  #applies(): Applicability {
    const value = this.#fields['applies'];
    if (value === undefined || value === null) return appliesToAll;
    if (!isFields(value)) {
      this.#complain(
        'applies',
        'In the front matter `applies` should hold `years`, `markets` or `frames`: `applies: {years: 1978-1981}`.',
      );
      return appliesToAll;
    }
    const { applies, unreadableYears } = readApplicability({
      years: this.#names('applies', value['years']),
      markets: this.#names('applies', value['markets']),
      frames: this.#names('applies', value['frames']),
    });
    if (unreadableYears !== null) {
      this.#complain(
        'applies',
        `The years \`${shortened(unreadableYears)}\` cannot be read. Write them as 1978, 1978-1981, 1980- or -1979.`,
      );
    }
    return applies;
  }

  #colours(): ColourSystem {
    const name = this.#oneOf('colours', colourSystemNames);
    const key = this.#fields['colour-key'];
    if (name === null) return { name: 'jis' };
    if (name !== 'own') return { name };
    if (!isFields(key)) {
      this.#complain('colours', '`colours: own` needs a key: `colour-key: {B: white, N: black}`.');
      return { name: 'own', key: {} };
    }
    return { name: 'own', key: this.#colourKey(key) };
  }

  #colourKey(key: Fields): Readonly<Record<string, ColourName>> {
    const read: [string, ColourName][] = [];
    for (const [code, value] of Object.entries(key)) {
      const colour = colourOfWords(textOf(value) ?? '');
      if (colour !== null) read.push([code, colour]);
      else
        this.#complain(
          'colour-key',
          `In the colour key \`${shortened(code)}\` should be a colour in words, as in \`${shortened(code)}: light green\`.`,
        );
    }
    return Object.fromEntries(read);
  }

  #sources(): readonly Source[] {
    const value = this.#fields['sources'];
    if (value === undefined || value === null) return [];
    const expected = 'Each source is written as `- {id: m1, kind: factory-manual, title: …, where: …}`.';
    if (!Array.isArray(value)) {
      this.#complain('sources', `In the front matter \`sources\` should be a list. ${expected}`);
      return [];
    }
    const sources: Source[] = [];
    value.forEach((entry: unknown, index) => {
      const fields = isFields(entry) ? entry : {};
      const id = textOf(fields['id']) ?? '';
      const kindWritten = textOf(fields['kind']) ?? '';
      const kind = sourceKinds.find((name) => name === kindWritten.toLowerCase());
      if (id === '' || /[\s,;]/.test(id)) {
        this.#complain('sources', `Source ${index + 1} has no id without spaces. ${expected}`);
      } else if (kind === undefined) {
        this.#complain(
          'sources',
          `The kind of source \`${shortened(id)}\` is not known. Write one of ${sourceKinds.join(', ')}.`,
        );
      } else if (sources.some((source) => source.id === id)) {
        this.#complain('sources', `Two sources have the id \`${shortened(id)}\`. Give each its own.`);
      } else {
        sources.push({ id, kind, title: textOf(fields['title']) ?? '', where: textOf(fields['where']) ?? null });
      }
    });
    return sources;
  }

  #facts(): SubjectFacts {
    const markets = readApplicability({ markets: this.#names('markets', this.#fields['markets']) }).applies.markets;
    return {
      maker: this.#text('maker'),
      model: this.#text('model'),
      years: this.#text('years'),
      markets,
      voltage: this.#text('voltage'),
      ignition: this.#text('ignition'),
      charging: this.#text('charging'),
      battery: this.#text('battery'),
      earth: this.#oneOf<'negative' | 'positive'>('earth', ['negative', 'positive']),
    };
  }
}

/** A field's words: null where it is empty, undefined where it is a list or has fields of its own. */
function textOf(value: unknown): string | null | undefined {
  if (value === null || value === undefined) return null;
  if (typeof value === 'object') return undefined;
  if (typeof value !== 'string' && typeof value !== 'number' && typeof value !== 'boolean') return undefined;
  const text = String(value).trim();
  return text === '' ? null : text;
}
