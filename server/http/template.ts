/** What a page puts into index.html. */
export interface TemplateParts {
  readonly head: string;
  readonly body: string;
  readonly state: string;
}

const markers = { head: '<!--head-->', body: '<!--page-->', state: '<!--state-->' } as const;

/**
 * Fills index.html, as the bytes that are sent: joining the parts to one text first would copy a long page twice more.
 * Nothing is replaced by pattern, since a page's text may contain anything.
 */
export function fillTemplate(template: string, parts: TemplateParts): Buffer {
  const filled: string[] = [];
  let from = 0;
  for (const name of ['head', 'body', 'state'] as const) {
    const at = template.indexOf(markers[name], from);
    if (at < 0) throw new Error(`index.html has no ${markers[name]} where it belongs`);
    filled.push(template.slice(from, at), parts[name]);
    from = at + markers[name].length;
  }
  return Buffer.concat([...filled, template.slice(from)].map((part) => Buffer.from(part)));
}

/** Words for where the site itself cannot answer: no script is needed to read them. */
export function refusalPage(template: string, { title, detail }: { title: string; detail: string }): Buffer {
  return fillTemplate(template, {
    head: `<title>${escapeHtml(title)} · Earthstrap</title><meta name="robots" content="noindex">`,
    body:
      `<main class="sheet"><div class="sheet-field"><div class="sheet-title"><h1>${escapeHtml(title)}</h1>` +
      `<p class="sheet-lead">${escapeHtml(detail)}</p></div>` +
      `<p class="button-row"><a class="button button-primary" href="/">Go to the first page</a></p></div></main>`,
    state: '',
  });
}

function escapeHtml(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;');
}
