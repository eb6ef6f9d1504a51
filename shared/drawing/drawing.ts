/** A drawing as values: an SVG element with its attributes and what is inside. Both sides turn it into markup the same way. */
export interface Drawing {
  readonly tag: string;
  readonly attributes: Readonly<Record<string, string | number>>;
  readonly children: readonly (Drawing | string)[];
}

/** An element of a drawing; attributes that are undefined are left out. */
export function element(
  tag: string,
  attributes: Readonly<Record<string, string | number | undefined>>,
  ...children: readonly (Drawing | string | null)[]
): Drawing {
  const given: Record<string, string | number> = {};
  for (const [name, value] of Object.entries(attributes)) if (value !== undefined) given[name] = value;
  return { tag, attributes: given, children: children.filter((child) => child !== null) };
}

/**
 * A drawing as markup, for an HTML document. Every text and attribute is escaped, so that nothing a member wrote can
 * become markup.
 */
export function drawingMarkup(drawing: Drawing): string {
  const attributes = Object.entries(drawing.attributes).map(([name, value]) => ` ${name}="${escape(String(value))}"`);
  const inside = drawing.children.map((child) => (typeof child === 'string' ? escape(child) : drawingMarkup(child)));
  return `<${drawing.tag}${attributes.join('')}>${inside.join('')}</${drawing.tag}>`;
}

const entities: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };

function escape(text: string): string {
  return text.replace(/[&<>"]/g, (character) => entities[character] ?? '');
}
