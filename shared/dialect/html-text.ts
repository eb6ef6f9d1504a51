const entities: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', '\0': '\uFFFD' };

/** A text as it may stand between tags or in a quoted attribute, whatever is in it. */
export function escapeHtml(text: string): string {
  return text.replace(/[&<>"\0]/g, (character) => entities[character] ?? '');
}

/** An opening tag; attributes that are null or false are left out, true ones have no value. */
export function openTag(name: string, attributes: Readonly<Record<string, string | number | boolean | null>>): string {
  const written = Object.entries(attributes).flatMap(([attribute, value]) => {
    if (value === null || value === false) return [];
    return [value === true ? attribute : `${attribute}="${escapeHtml(String(value))}"`];
  });
  return `<${[name, ...written].join(' ')}>`;
}

/** The link to an address on the same page. Half a surrogate pair, which no address can hold, becomes a sign that it is not. */
export function fragment(address: string): string {
  return `#${encodeURI(address.replace(/\p{Surrogate}/gu, '\uFFFD'))}`;
}
