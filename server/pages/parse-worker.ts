import { parentPort } from 'node:worker_threads';
import type { TextRefusal } from '../../shared/dialect/page-text.ts';
import { readPage } from '../../shared/dialect/read-page.ts';
import { renderPage } from '../../shared/dialect/render-page.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';
import type { FromParseWorker, ParseRequest } from './parse-pool-types.ts';

/** What slips past the first look and is too deep for the parser's stack. */
const tooDeep: TextRefusal = {
  limit: 'depth',
  message: 'This text is nested too deeply to be read. Take some levels of quotes or lists out of one another.',
  line: null,
};

function read({ markdown, context, address, variant }: ParseRequest): FromParseWorker {
  try {
    const text = readPage(markdown, context);
    if (!text.ok) return { kind: 'refused', refusal: text.refusal };
    return {
      kind: 'read',
      page: { text: text.value, html: renderPage(text.value, { address, variant, marks: 'shown' }) },
    };
  } catch (failure) {
    if (failure instanceof RangeError) return { kind: 'refused', refusal: tooDeep };
    return { kind: 'failed', stack: failure instanceof Error ? (failure.stack ?? failure.message) : String(failure) };
  }
}

function say(message: FromParseWorker): void {
  parentPort?.postMessage(message);
}

/** A page that makes the parser ready: its first text is many times slower than the next, and that is no text's fault. */
const firstText = `---
title: First
kind: pinouts
summary: None
---

## Words

> - *One* [link](#here)

:::connector{#one layout="2" seen="wire side"}
| Cavity | Wire | Goes to |
| ------ | ---- | ------- |
| 1 | Y/R | two.1 |
:::
`;

read({ markdown: firstText, context: { idsElsewhere: [] }, address: null, variant: anyVariant });

parentPort?.on('message', (request: ParseRequest) => {
  say({ kind: 'reading' });
  say(read(request));
});
