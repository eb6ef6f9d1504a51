import { isSlug } from '../../shared/lib/slug.ts';
import { anyVariant, type Variant } from '../../shared/pages/applicability.ts';
import { parseVariant } from '../../shared/pages/variant.ts';

/** What a reader has on the bench, by the cookies that src/lib/bench.ts writes. */
export interface BenchChoice {
  readonly bench: string | null;
  readonly variant: Variant;
}

/** Reads the donor on the bench and which one of it; what cannot be read counts as not chosen. */
export function readBenchCookies(header: string | undefined): BenchChoice {
  const bench = readCookie(header ?? '', 'bench');
  if (bench === null || !isSlug(bench)) return { bench: null, variant: anyVariant };
  const chosen = new URLSearchParams(readCookie(header ?? '', 'variant') ?? '');
  const variant = parseVariant({ year: chosen.get('year'), market: chosen.get('market'), frame: chosen.get('frame') });
  return { bench, variant };
}

function readCookie(header: string, name: string): string | null {
  const pair = header.split(';').find((text) => text.trim().startsWith(`${name}=`));
  if (pair === undefined) return null;
  try {
    return decodeURIComponent(pair.slice(pair.indexOf('=') + 1).trim());
  } catch {
    return null;
  }
}
