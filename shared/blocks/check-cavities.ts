import { shortened } from '../lib/quoted.ts';
import { finding, type Finding } from '../pages/finding.ts';
import { areDisjoint } from '../pages/variant.ts';
import type { ConnectorBlock, ConnectorLine } from './block.ts';
import { cavitiesIn } from './read-layout.ts';
import { cavitiesOutside } from './seats.ts';

/** Finds cavities that stand twice in a connector's table for one and the same bike, and cavities that its face lacks. */
export function checkCavities(connector: ConnectorBlock): readonly Finding[] {
  return [...repeatedCavities(connector), ...outsideFace(connector)];
}

function repeatedCavities({ lines }: ConnectorBlock): readonly Finding[] {
  const seen = new Map<string, ConnectorLine[]>();
  const findings: Finding[] = [];
  for (const line of lines) {
    if (line.further > 0) continue;
    const earlier = seen.get(line.cavity) ?? [];
    const clash = earlier.find((other) => !areDisjoint(other.applies, line.applies));
    if (clash !== undefined) {
      const message = `Cavity ${shortened(line.cavity)} already stands on line ${clash.line}. A second wire in it is a row \`${shortened(line.cavity)}+\`; otherwise say in Years, Markets or Frames which row holds when.`;
      findings.push(finding('cavity-repeated', message, line.line, `#${line.address}`));
    }
    seen.set(line.cavity, [...earlier, line]);
  }
  return findings;
}

function outsideFace(connector: ConnectorBlock): readonly Finding[] {
  const outside = new Set(cavitiesOutside(connector));
  const count = cavitiesIn(connector.layout);
  return connector.lines
    .filter(({ cavity, further }) => further === 0 && outside.has(cavity))
    .map(({ cavity, line, address }) => {
      const message = `Cavity ${shortened(cavity)} is not on the face: its layout has ${count === 1 ? 'one cavity' : `${count} cavities`}. Correct the layout or the cavity.`;
      return finding('cavity-outside-face', message, line, `#${address}`);
    });
}
