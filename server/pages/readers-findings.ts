import type { Finding, FindingCode } from '../../shared/pages/finding.ts';

/** Hints that a page has by the dozen while it grows: readers see one of each, with what it is about. */
const gathered: Readonly<Partial<Record<FindingCode, (count: number) => string>>> = {
  uncited: (count) =>
    `${String(count)} blocks of this page name no source, so nothing backs their lines but the author’s word`,
  'face-unoriented': (count) =>
    `On ${String(count)} connectors of this page nothing says where the first cavity is: go by the colours`,
};

/** At most so many addresses are named in a gathered finding. */
const mostNamed = 6;

function gather(code: FindingCode, findings: readonly Finding[], words: (count: number) => string): Finding | null {
  const [first] = findings;
  if (first === undefined || findings.length === 1) return first ?? null;
  const addresses = findings.flatMap(({ address }) => (address === undefined ? [] : [address.replace(/^.*#/, '')]));
  const named = addresses.slice(0, mostNamed).join(', ');
  const rest = addresses.length > mostNamed ? ' …' : '';
  const message = named === '' ? `${words(findings.length)}.` : `${words(findings.length)}: ${named}${rest}.`;
  return { code, severity: first.severity, message, line: first.line };
}

/** A page's findings as readers see them: those that stop first, hints of one kind gathered into one. */
export function readersFindings(findings: readonly Finding[]): Finding[] {
  const order = { stop: 0, warn: 1, hint: 2 } as const;
  const single = findings.filter(({ code }) => gathered[code] === undefined);
  const together = Object.entries(gathered).flatMap(([code, words]) => {
    const ofCode = findings.filter((finding) => finding.code === code);
    const one = gather(code as FindingCode, ofCode, words);
    return one === null ? [] : [one];
  });
  return [...single, ...together].toSorted((a, b) => order[a.severity] - order[b.severity] || a.line - b.line);
}
