import type { Applicability } from './applicability.ts';
import { parseYears } from './years.ts';

/** What is written in the three cells, or the three fields of front matter; null and dashes hold for all. */
export interface WrittenApplicability {
  readonly years?: string | null;
  readonly markets?: string | null;
  readonly frames?: string | null;
}

/** What was read, and the years' text where it could not be. */
export interface ApplicabilityReading {
  readonly applies: Applicability;
  readonly unreadableYears: string | null;
}

const nothingPattern = /^(?:|[-–—]|all|any)$/i;

/**
 * Reads what something holds for. Names of markets and frames stay as written, without repetitions (`UK`, `uk`).
 * Years that cannot be read hold for all, and are given back for a finding.
 */
export function readApplicability(written: WrittenApplicability): ApplicabilityReading {
  const yearsWritten = plain(written.years);
  const years = parseYears(yearsWritten);
  return {
    applies: {
      years: years ?? [],
      markets: readNames(plain(written.markets), /[,;/]/),
      frames: readNames(plain(written.frames), /[,;]/),
    },
    unreadableYears: years === null ? yearsWritten : null,
  };
}

function plain(text: string | null | undefined): string {
  const trimmed = (text ?? '').trim();
  return nothingPattern.test(trimmed) ? '' : trimmed;
}

function readNames(text: string, separators: RegExp): readonly string[] {
  const names = new Map<string, string>();
  for (const part of text.split(separators)) {
    const name = part.trim().replace(/\s+/g, ' ');
    const key = name.toLowerCase();
    if (name !== '' && !names.has(key)) names.set(key, name);
  }
  return [...names.values()];
}
