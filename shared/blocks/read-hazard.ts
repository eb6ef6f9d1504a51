import { quoted } from '../lib/quoted.ts';
import type { Finding } from '../pages/finding.ts';
import { hazardKinds, signalWords, type HazardBlock, type HazardKind } from './block.ts';
import { attribute, oneOf, readHead, unreadable, type BlockReading } from './block-reading.ts';
import { namesIn } from './cell-text.ts';
import { plainWords } from './plain-words.ts';
import type { SourceBlock } from './source-table.ts';

/** More than these are not looked for in one attribute. */
const mostNamed = 20;

/** Reads a caution. One whose signal word is missing or not known is a warning: a caution is never dropped. */
export function readHazard(source: SourceBlock): BlockReading {
  const findings: Finding[] = [];
  const signal = oneOf(source, 'signal', signalWords, findings);
  if (signal === null && attribute(source, 'signal') === null) {
    findings.push(
      unreadable(source, `has no signal word. Write signal="warning" or another of: ${signalWords.join(', ')}.`),
    );
  }
  const text = plainWords(source.text);
  if (text === '')
    findings.push(unreadable(source, 'says nothing. Write what the hazard is, what happens, and how to avoid it.'));
  const of: HazardKind[] = [];
  for (const name of namesIn(attribute(source, 'of') ?? '').slice(0, mostNamed)) {
    const kind = hazardKinds.find((candidate) => candidate === name.toLowerCase());
    if (kind === undefined) {
      findings.push(
        unreadable(
          source,
          `is \`of\` ${quoted(name)}, which is no hazard. Write one or more of: ${hazardKinds.join(', ')}.`,
        ),
      );
    } else if (!of.includes(kind)) {
      of.push(kind);
    }
  }
  const block: HazardBlock = {
    kind: 'hazard',
    ...readHead(source, ['signal', 'of']),
    signal: signal ?? 'warning',
    of,
    text,
  };
  return { block, findings };
}
