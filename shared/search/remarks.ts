import { wireColourWords } from '../wire-colours/colour-words.ts';
import type { LinesIndex } from './lines-index.ts';
import type { LinesAnswer } from './query-lines.ts';
import type { ColourWanted } from './read-colour-query.ts';
import type { QueryTerm, ReadQuery } from './read-query.ts';

/** What else the search knows when it says what it made of a query. */
export interface RemarkContext {
  readonly bench: string | null;
  readonly proseFound: boolean;
}

/** What the search made of a query, in sentences, where that helps the asker to trust the answer or to ask better. */
export function remarksOn(
  index: LinesIndex,
  query: ReadQuery,
  lines: LinesAnswer,
  { bench, proseFound }: RemarkContext,
): string[] {
  return [
    ...query.terms.flatMap(remarkOnTerm),
    ...lines.mended.map(({ written, word }) => `Read “${written}” as “${word}”.`),
    ...remarkOnUnanswered(lines, proseFound),
    ...remarkOnNothing(query, lines),
    ...(lines.someWordsOnly ? ['No line has all of these words: these have some of them.'] : []),
    ...remarkOnVariant(query, lines),
    ...remarkOnBench(index, lines, bench),
  ];
}

function remarkOnTerm(term: QueryTerm): string[] {
  if (term.kind === 'no-colour') return [`“${term.written}” is not a colour in any system that this book reads.`];
  if (term.kind !== 'colour' || term.colours.length < 2) return [];
  return [`“${term.written}” can mean ${list(term.colours.map(wantedWords), 'or')}: each is looked for.`];
}

function wantedWords({ base, tracer }: ColourWanted): string {
  if (base === 'any') return `any wire with a ${tracer === 'any' || tracer === null ? 'tracer' : `${tracer} tracer`}`;
  return tracer === 'any' ? base : wireColourWords({ base, tracer });
}

/** Words left out are said; so is that other words were not. */
function remarkOnUnanswered({ unanswered, lines, barred }: LinesAnswer, proseFound: boolean): string[] {
  const words = unanswered.filter(({ kind }) => kind === 'word').map(({ written }) => `“${written}”`);
  if (words.length > 0 && barred) return [`No line says ${list(words, 'or')}: none is shown for the rest alone.`];
  if (words.length === 0 || (lines.length === 0 && proseFound)) return [];
  return [
    lines.length > 0
      ? `No line says ${list(words, 'or')}, so that was left out.`
      : `Nothing in the book says ${list(words, 'or')}.`,
  ];
}

function remarkOnNothing({ terms }: ReadQuery, { lines, namesLine, elsewhere, subjectTerms }: LinesAnswer): string[] {
  if (!namesLine || lines.length > 0) return [];
  const codes = terms.filter((term) => !subjectTerms.includes(term)).flatMap(codeWords);
  if (codes.length === 0) return [];
  const words = terms
    .filter((term) => term.kind === 'word' || subjectTerms.includes(term))
    .map(({ written }) => `“${written}”`);
  const where = words.length === 0 ? '' : ` together with ${list(words, 'and')}`;
  const offer = elsewhere.length > 0 ? ' Below is what is there instead.' : '';
  return [`No line of the book has ${list(codes, 'and')}${where}. None that is merely near is shown.${offer}`];
}

function codeWords(term: QueryTerm): string[] {
  switch (term.kind) {
    case 'colour':
      return [list(term.colours.map(wantedWords), 'or')];
    case 'cavity':
      return [term.of === null ? `a cavity ${term.name}` : term.written];
    case 'number':
      return [`“${term.written}”`];
    case 'size':
      return [`${term.squareMillimetres} mm²`];
    case 'word':
    case 'no-colour':
      return [];
  }
}

function remarkOnVariant({ year }: ReadQuery, { variant, lines }: LinesAnswer): string[] {
  const remarks = year === null ? [] : [`Read ${year.written} as the model year.`];
  const setBack = lines.filter(({ applies }) => !applies.applies).length;
  if (setBack === 0) return remarks;
  const bike = [variant.year, variant.market, variant.frame].filter((part) => part !== null).join(', ');
  const last = setBack === lines.length ? 'None of these lines holds' : 'Lines that do not hold';
  return [
    ...remarks,
    `${last} for ${bike}${setBack === lines.length ? '' : ' stand last'}: each says what it holds for.`,
  ];
}

function remarkOnBench({ subjects }: LinesIndex, { lines, namesSubject }: LinesAnswer, bench: string | null): string[] {
  const title = subjects.find(({ shelf, slug }) => shelf === 'donors' && slug === bench)?.title;
  if (title === undefined || lines.length === 0) return [];
  const ofBench = lines.filter(({ onBench }) => onBench).length;
  if (namesSubject !== null) return [];
  if (ofBench === 0)
    return [
      `No line of ${title}, which is on your bench, answers this. These are other machines’: their colours say nothing about yours.`,
    ];
  return ofBench === lines.length ? [] : [`${title} is on your bench: its lines come first.`];
}

function list(words: readonly string[], last: 'and' | 'or'): string {
  const end = words.at(-1) ?? '';
  return words.length < 2 ? end : `${words.slice(0, -1).join(', ')} ${last} ${end}`;
}
