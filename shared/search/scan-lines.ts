import type { Variant } from '../pages/applicability.ts';
import { appliesTo, type Applies } from '../pages/variant.ts';
import { addressedTerm, leadsTo, type Addressed } from './addressed-terms.ts';
import { createBestLines, type LineFound } from './best-lines.ts';
import type { LinesIndex } from './lines-index.ts';
import type { QueryTerm } from './read-query.ts';
import type { HolderKind } from './search-document.ts';
import { bitCount, exactShift, type TermMasks } from './term-masks.ts';

/** What a search is asked for besides the query. */
export interface LinesQueryOptions {
  /** The slug of the donor on the bench, whose lines come first. */
  readonly bench: string | null;
  /** The one bike that is meant: lines that it rules out come last. */
  readonly variant: Variant;
  /** What other donors' lines are held against: the year of the bike on the bench says nothing about another. */
  readonly variantElsewhere: Variant;
  readonly limit: number;
}

/** What one pass found: the best lines, how many there are, and whether any term is the line's own and not its donor's name. */
export interface Scanned {
  readonly lines: readonly LineFound[];
  readonly count: number;
  readonly inLine: boolean;
}

/** Looks through an index for one query. */
export interface Scan {
  /** True where every term is part of one subject's name: then its pages answer, not all its lines. */
  namesOnlySubject(required: number): boolean;
  /** True where a term is part of a subject's own name, other than the donor on the bench. */
  namesOtherSubject(): boolean;
  /** The terms that are part of any subject's name. */
  readonly subjectTerms: number;
  /** Named blocks that the given terms lead to, those of the bench first. */
  holdersNamed(terms: number): readonly number[];
  /**
   * Looks at every line.
   * @param wanted the terms that count
   * @param required those that a line must have; 0 for any one that is not its subject's or page's name
   */
  run(wanted: number, required: number): Scanned;
}

/** What an answer in each place is worth. Chosen so that the golden list comes out as its reasons say. */
const weights = { wire: 6, holder: 6, text: 5, own: 4.5, detail: 2, end: 1.5, zone: 1, subject: 1, page: 0.5 } as const;
const exactly = 0.75;
const kindWeights: Readonly<Record<HolderKind, number>> = {
  connector: 1,
  components: 0.9,
  switch: 0.6,
  wires: 0.6,
  checks: -1,
  inside: -1,
};
const safeModification = -2;
const emptyCavity = -3;
/** For the other side: a right indicator where the left one is asked for, found by its left cluster. */
const otherSide = -6;
const mostElsewhere = 3;
const blankState = 1;
/** Groups outweigh every score: lines of the bench, then those with more of the terms. */
const groups = { bench: 10_000, term: 500 } as const;
/** The most that a line's kind and its texts' wholeness add to what its terms are worth. */
const mostBesides = 1 + 2 + 1;

const lowHalf = (1 << exactShift) - 1;

/** Prepares to look through an index for a query. */
export function createScan(
  index: LinesIndex,
  terms: readonly QueryTerm[],
  found: TermMasks,
  options: LinesQueryOptions,
): Scan {
  const {
    holders,
    pages,
    subjects,
    vocabulary,
    texts,
    details,
    colour,
    own,
    sizes,
    endStart,
    endIds,
    endTerminals,
    states,
  } = index;
  const { texts: masks, against, cavities, terminals, colours, sizes: sizeMasks } = found;
  const { offsets, units } = vocabulary;
  const appliesOnBench = index.applicabilities.map((applicability) => appliesTo(applicability, options.variant));
  const appliesElsewhere = index.applicabilities.map((applicability) =>
    appliesTo(applicability, options.variantElsewhere),
  );
  const addressed: Addressed[] = [];
  let canBeCavity = 0;
  let bareNumbers = 0;
  let ofAddresses = 0;
  terms.forEach((term, number) => {
    if (term.kind === 'cavity' || term.kind === 'number' || term.kind === 'colour') canBeCavity |= 1 << number;
    if (term.kind === 'number' && term.rating === 'no') bareNumbers |= 1 << number;
    if (term.kind !== 'cavity' || term.of === null) return;
    ofAddresses |= 1 << number;
    addressed.push(addressedTerm(index, term.of, term.name, 1 << number));
  });
  const connectorTerms = canBeCavity === 0 ? null : termsOfConnectors(index, masks);
  const holds: Applies = { applies: true };

  function subjectMask(subject: number): number {
    return masks[offsets.subjects + subject] ?? 0;
  }

  /** The terms that name what a line leads to. */
  function idsOfEnds(line: number): number {
    let named = 0;
    const last = endStart[line + 1] ?? 0;
    for (let end = endStart[line] ?? 0; end < last; end += 1)
      named |= masks[offsets.ends + (endIds.places[end] ?? 0)] ?? 0;
    return named;
  }

  /** The mask of the one end of a line that has all of these terms, its terminal among them; 0 where none has. */
  function endThatHas(line: number, wanted: number): number {
    const last = endStart[line + 1] ?? 0;
    for (let end = endStart[line] ?? 0; end < last; end += 1) {
      const terminal = (terminals[endTerminals.places[end] ?? 0] ?? 0) & ~ofAddresses;
      const both = terminal | (masks[offsets.ends + (endIds.places[end] ?? 0)] ?? 0);
      if ((terminal & wanted) !== 0 && (both & wanted) === wanted) return both;
    }
    return 0;
  }

  function namesOnlySubject(required: number): boolean {
    return subjects.some((_, subject) => (subjectMask(subject) & lowHalf & required) === required);
  }

  function namesOtherSubject(): boolean {
    return subjects.some(({ slug }, subject) => slug !== options.bench && subjectMask(subject) >>> exactShift !== 0);
  }

  function holdersNamed(wanted: number): readonly number[] {
    if (wanted === 0) return [];
    const named: { holder: number; rank: number }[] = [];
    holders.forEach(({ page, id }, holder) => {
      if (id === '') return;
      const subject = pages[page]?.subject ?? 0;
      const itself = (masks[offsets.holders + holder] ?? 0) & wanted;
      const around = (subjectMask(subject) | (masks[offsets.pages + page] ?? 0)) & wanted;
      if (itself === 0 || (itself | around) !== wanted) return;
      named.push({ holder, rank: (subjects[subject]?.slug === options.bench ? 100 : 0) + bitCount(itself) });
    });
    return named
      .sort((a, b) => b.rank - a.rank || a.holder - b.holder)
      .slice(0, mostElsewhere)
      .map(({ holder }) => holder);
  }

  function run(wanted: number, required: number): Scanned {
    const best = createBestLines(options.limit);
    const setBack = createBestLines(Math.ceil(options.limit / 3));
    let count = 0;
    let inLine = false;
    let rest = 0;
    let score = 0;
    const mostScore = bitCount(wanted) * weights.wire * (1 + exactly) + mostBesides;
    /** Counts each term once, where it is worth most. */
    function weigh(mask: number, weight: number): void {
      const hit = mask & rest;
      if (hit === 0) return;
      score += weight * (bitCount(hit) + exactly * bitCount((mask >>> exactShift) & hit));
      rest &= ~hit;
    }
    for (let at = 0; at < holders.length; at += 1) {
      const holder = holders[at];
      if (holder === undefined || holder.start === holder.end) continue;
      const page = pages[holder.page];
      const subject = page?.subject ?? 0;
      const ofSubject = subjectMask(subject);
      const ofPage = masks[offsets.pages + holder.page] ?? 0;
      const ofHolder = masks[offsets.holders + at] ?? 0;
      const isConnector = holder.kind === 'connector';
      const around = ofSubject | ofPage | ofHolder;
      const ofConnectors = connectorTerms?.[subject] ?? 0;
      // With a colour or cavity, a zone's name stands for a connector only where the donor has none of that name.
      const ofZone = (masks[offsets.zones + at] ?? 0) & ~ofConnectors;
      const onBench = options.bench !== null && subjects[subject]?.slug === options.bench;
      const applies = onBench ? appliesOnBench : appliesElsewhere;
      let elsewhere = 0;
      for (const { bit, id, subjects: with_ } of addressed)
        if (id !== holder.id && with_.has(subject)) elsewhere |= bit;
      for (let line = holder.start; line < holder.end; line += 1) {
        const text = texts.places[line] ?? 0;
        const ofText = masks[offsets.texts + text] ?? 0;
        const ofDetail = (masks[offsets.details + (details.places[line] ?? 0)] ?? 0) & ~bareNumbers;
        const ownPlace = own[line] ?? 0;
        const ofOwn = isConnector ? 0 : (masks[offsets.names + ownPlace] ?? 0);
        const ofWire = (colours[colour[line] ?? 0] ?? 0) | (sizeMasks[sizes.places[line] ?? 0] ?? 0);
        let ofEnds = idsOfEnds(line);
        let ofCavity = 0;
        let has = around | ofZone | ofText | ofDetail | ofOwn | ofWire | ofEnds;
        if (required === 0) {
          if ((has & wanted & ~ofSubject & ~ofPage) === 0) continue;
        } else if ((has & required) !== required) {
          if (canBeCavity === 0) continue;
          // A cavity counts only with words that name its own connector: `headlight 9` is no ninth cavity of another one
          // that leads to the headlight. Where the subject has no connector of that name, the circuit's will do.
          ofCavity = isConnector ? (cavities[ownPlace] ?? 0) & ~elsewhere : 0;
          has = around | ofWire | ofCavity | ofZone | ((ofText | ofDetail | ofOwn) & ~ofConnectors);
          if ((has & required) !== required) {
            ofCavity = 0;
            ofEnds = addressed.length > 0 ? leadsTo(index, addressed, line, holder, ownPlace) : 0;
            if (ofEnds !== 0) has = around | ofWire | ofText | ofDetail | ofOwn | ofEnds | idsOfEnds(line);
            if (ofEnds === 0 || (has & required) !== required) {
              // Or by a terminal that it leads to, which counts only with words that name that same end.
              ofEnds = endThatHas(line, required & ~(ofSubject | ofPage | ofWire));
              if (ofEnds === 0) continue;
            }
          }
        }
        count += 1;
        if (((ofText | ofOwn | ofHolder | ofWire | ofCavity) & wanted & ~ofSubject) !== 0) inLine = true;
        const appliesHere = applies[index.applies[line] ?? 0] ?? holds;
        const group = (onBench ? groups.bench : 0) + (required === 0 ? bitCount(has & wanted) * groups.term : 0);
        const among = appliesHere.applies ? best : setBack;
        if (group + mostScore <= among.least()) continue;
        rest = wanted;
        score = kindWeights[holder.kind];
        weigh(ofCavity | ofWire, weights.wire);
        weigh(ofHolder, weights.holder);
        weigh(ofText, weights.text);
        weigh(ofOwn, weights.own);
        weigh(ofDetail, weights.detail);
        weigh(ofEnds, weights.end);
        weigh(ofZone, weights.zone);
        weigh(ofSubject, weights.subject);
        weigh(ofPage, weights.page);
        score += 2 * wholeness(ofText, units[offsets.texts + text]) + wholeness(ofHolder, units[offsets.holders + at]);
        if (page?.kind === 'safe-mods') score += safeModification;
        if (((against[offsets.texts + text] ?? 0) & ~ofText & wanted) !== 0) score += otherSide;
        if (states[line] === blankState && ofCavity === 0) score += emptyCavity;
        among.offer({ line, holder: at, applies: appliesHere, onBench, score: group + score });
      }
    }
    // Lines that the bike rules out come last, and room is kept for them: they may be the very wire that is in somebody's hand.
    const holding = best.lines.slice(0, options.limit - setBack.lines.length);
    return { lines: [...holding, ...setBack.lines], count, inLine };
  }

  const subjectTerms = subjects.reduce((terms_, _, subject) => terms_ | subjectMask(subject), 0) & lowHalf;
  return { namesOnlySubject, namesOtherSubject, subjectTerms, holdersNamed, run };
}

/** For each subject, the terms that name one of its connectors. */
function termsOfConnectors({ subjects, pages, holders, vocabulary }: LinesIndex, masks: Int32Array): Int32Array {
  const terms = new Int32Array(subjects.length);
  holders.forEach(({ page, kind }, holder) => {
    if (kind !== 'connector') return;
    const subject = pages[page]?.subject ?? 0;
    terms[subject] = (terms[subject] ?? 0) | (masks[vocabulary.offsets.holders + holder] ?? 0);
  });
  return terms;
}

/** How much of what a text says was asked for, from 0 to 1: `Main beam` is asked for wholly by `high beam`. */
function wholeness(mask: number, units: number | undefined): number {
  return mask === 0 || units === undefined || units === 0 ? 0 : Math.min(1, bitCount(mask & lowHalf) / units);
}
