import { furtherCircuits, furtherEnds } from './made-loom.ts';
import { createDice, createWriter, pick } from './made-words.ts';

const letters = ['B', 'Br', 'G', 'L', 'O', 'P', 'R', 'V', 'W', 'Y'];
const rowsOfTable = 10;

const frontMatter = [
  '---',
  'title: Connectors made for measuring',
  'kind: pinouts',
  'summary: A page as somebody might write it, of invented connectors.',
  'colours: jis',
  'sources:',
  '  - id: m1',
  '    kind: factory-manual',
  '    title: Workshop manual (made for measuring)',
  '    where: chapter 14',
  '---',
  '',
].join('\n');

/**
 * A page as an honest writer would write it: every section has a heading, a stretch of prose and a connector with its
 * table, together about 2 kB. The same for the same number of sections, and a longer page begins with a shorter one.
 */
export function honestPage(sections: number): string {
  const dice = createDice(41);
  const write = createWriter(dice, 4000);
  const parts = Array.from({ length: sections }, (_, index) => {
    const id = `plug-${String(index + 1)}`;
    const rows = Array.from({ length: rowsOfTable }, (_row, at) => {
      const wire = at % 3 === 0 ? pick(dice, letters) : `${pick(dice, letters)}/${pick(dice, letters)}`;
      return `| ${String(at + 1)} | ${wire} | 0.85 | ${pick(dice, furtherCircuits)} | ${pick(dice, furtherEnds)} | 1980- | |`;
    });
    return [
      `## Connector ${String(index + 1)}`,
      '',
      write(120),
      '',
      `${write(70)} See [cavity 2](#${id}.2), *latch up*, and \`${id}.3\` for the **earth**.`,
      '',
      `:::connector{#${id} name="Plug ${String(index + 1)}" zone="headlight" layout="2x5" seen="wire side" first="top left" latch="top" contacts="sockets" cite="m1"}`,
      '| Cavity | Wire | mm² | Circuit | Goes to | Years | Note |',
      '| ------ | ---- | --- | ------- | ------- | ----- | ---- |',
      ...rows,
      ':::',
      '',
    ].join('\n');
  });
  return [frontMatter, ...parts].join('\n');
}
