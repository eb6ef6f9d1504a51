/*
 * The line that an address's fragment names, in HTML that the dialect rendered: its row is marked, and the cavity that
 * it sits in is ringed on both sides of the face.
 */

const markedRow = 'line-marked';
const ringedCavity = 'ringed';

/** The row that a fragment (`#headlight.3`) names inside some rendered HTML; null where it names no line of it. */
export function lineAt(root: Element, fragment: string): Element | null {
  const id = readFragment(fragment);
  if (id === '') return null;
  const found = root.ownerDocument.getElementById(id);
  return found !== null && root.contains(found) && found.matches('.line') ? found : null;
}

function readFragment(fragment: string): string {
  try {
    return decodeURIComponent(fragment.replace(/^#/, ''));
  } catch {
    return '';
  }
}

/** The name of the line that a fragment names, as far as the HTML's own text tells; null where it names none of it. */
export function lineNamed(fragment: string, html: string): string | null {
  const id = readFragment(fragment);
  const written = id.replaceAll('&', '&amp;').replaceAll('"', '&quot;');
  return id !== '' && html.includes(`data-line="${written}"`) ? id : null;
}

/** Marks the line that a fragment names, unmarks every other, and gives the marked row. */
export function markLine(root: Element, fragment: string): Element | null {
  for (const element of root.querySelectorAll(`.${markedRow}, .${ringedCavity}`)) {
    element.classList.remove(markedRow, ringedCavity);
    element.removeAttribute('aria-current');
  }
  const line = lineAt(root, fragment);
  dropTarget(root, line);
  if (line === null) return null;
  line.classList.add(markedRow);
  for (const cavity of cavitiesOf(line)) {
    cavity.classList.add(ringedCavity);
    cavity.setAttribute('aria-current', 'true');
  }
  return line;
}

/**
 * The router changes the address without the browser's noticing, so `:target` stays at the line that the page was
 * opened at, and the style sheet would go on marking it. A copy in its place is no longer the target.
 */
function dropTarget(root: Element, line: Element | null): void {
  const target = root.querySelector('.line:target');
  if (target === null || target === line) return;
  target.replaceWith(target.cloneNode(true));
}

/** Both sides' drawings of the cavity that a row sits in; none where the row is of no connector. */
function cavitiesOf(line: Element): Element[] {
  const name = line.getAttribute('data-cavity');
  const connector = line.closest('[data-connector]');
  if (name === null || connector === null) return [];
  return [...connector.querySelectorAll('.face [data-cavity]')].filter(
    (cavity) => cavity.getAttribute('data-cavity') === name,
  );
}

/** Brings a row into sight by as little as it takes, so that the face it was chosen on stays where it is. */
export function showLine(line: Element): void {
  line.scrollIntoView({ block: 'nearest' });
}
