import { escapeHtml } from './html-text.ts';

/**
 * A block's heading.
 * @param level one below that of the section it stands in, 2 to 6
 * @param name what readers call it
 * @param id what other lines call it, where that is not the name
 */
export function heading(level: number, name: string, id: string | null): string {
  const code = id === null ? '' : ` <code class="block-id">${escapeHtml(id)}</code>`;
  return `<h${level} class="block-name">${escapeHtml(name)}${code}</h${level}>`;
}
