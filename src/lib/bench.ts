import type { SubjectAddress } from '../../shared/pages/address.ts';
import { anyVariant, type Variant } from '../../shared/pages/applicability.ts';
import { parseVariant } from '../../shared/pages/variant.ts';
import { isSlug } from '../../shared/lib/slug.ts';

/** What a reader has on the bench: a donor by its slug, and which one of it. */
export interface Bench {
  readonly donor: string | null;
  readonly variant: Variant;
}

export const emptyBench: Bench = { donor: null, variant: anyVariant };

const cookieSeconds = 400 * 24 * 3600;

/** Reads `?year=&market=&frame=`; what cannot be read counts as not chosen. */
export function readVariant(parameters: URLSearchParams): Variant {
  return parseVariant({
    year: parameters.get('year'),
    market: parameters.get('market'),
    frame: parameters.get('frame'),
  });
}

/** True where nothing is chosen. */
export function isAnyVariant(variant: Variant): boolean {
  return variant.year === null && variant.market === null && variant.frame === null;
}

/** The query of a variant, with its `?`; empty where nothing is chosen. */
export function variantQuery(variant: Variant): string {
  const text = variantParameters(variant).toString();
  return text === '' ? '' : `?${text}`;
}

function variantParameters(variant: Variant): URLSearchParams {
  const parameters = new URLSearchParams();
  if (variant.year !== null) parameters.set('year', String(variant.year));
  if (variant.market !== null) parameters.set('market', variant.market);
  if (variant.frame !== null) parameters.set('frame', variant.frame);
  return parameters;
}

/** `1980, UK` as a reader says it; null where nothing is chosen. */
export function variantWords(variant: Variant): string | null {
  const words = [variant.year, variant.market, variant.frame === null ? null : `frame ${variant.frame}`];
  const said = words.filter((word) => word !== null);
  return said.length === 0 ? null : said.join(', ');
}

/**
 * Which variant a sheet of this subject is shown for: what its address says, else the bench's where this is the donor on
 * the bench. The year of one bike says nothing about another, nor about a part.
 */
export function variantFor(subject: SubjectAddress, parameters: URLSearchParams, bench: Bench): Variant {
  if (subject.shelf !== 'donors') return anyVariant;
  const asked = ['year', 'market', 'frame'].some((name) => parameters.has(name));
  if (asked) return readVariant(parameters);
  return subject.subject === bench.donor ? bench.variant : anyVariant;
}

/** Reads the bench from a `Cookie` header or from `document.cookie`. */
export function readBench(cookies: string): Bench {
  const donor = readCookie(cookies, 'bench');
  if (donor === null || !isSlug(donor)) return emptyBench;
  return { donor, variant: readVariant(new URLSearchParams(readCookie(cookies, 'variant') ?? '')) };
}

/** The cookies that keep a bench, as `Set-Cookie` says them; a null donor clears both. */
export function benchCookies(bench: Bench): string[] {
  if (bench.donor === null) return [cookie('bench', '', 0), cookie('variant', '', 0)];
  return [
    cookie('bench', bench.donor, cookieSeconds),
    isAnyVariant(bench.variant)
      ? cookie('variant', '', 0)
      : cookie('variant', variantParameters(bench.variant).toString(), cookieSeconds),
  ];
}

/** The cookie that keeps a reader's choice of face; null goes back to the system's. */
export function faceCookie(face: 'paper' | 'garage' | null): string {
  return face === null ? cookie('face', '', 0) : cookie('face', face, cookieSeconds);
}

function cookie(name: string, value: string, seconds: number): string {
  return `${name}=${encodeURIComponent(value)}; Path=/; Max-Age=${String(seconds)}; SameSite=Lax`;
}

/** The value of one cookie, decoded; null where it is absent or damaged. */
export function readCookie(cookies: string, name: string): string | null {
  for (const pair of cookies.split(';')) {
    const at = pair.indexOf('=');
    if (at < 0 || pair.slice(0, at).trim() !== name) continue;
    try {
      return decodeURIComponent(pair.slice(at + 1).trim());
    } catch {
      return null;
    }
  }
  return null;
}
