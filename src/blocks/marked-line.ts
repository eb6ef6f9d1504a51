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

/**
 * Brings a row into sight by as little as it takes: below the face that it was chosen on, where that stands at the top
 * while the rows pass under it, and above what stands at the foot of the window (the row's own margin says how much).
 */
export function showLine(line: Element): void {
  const row = line.getBoundingClientRect();
  const top = heightOfFaceAbove(line, row);
  const window = line.ownerDocument.defaultView;
  if (window === null) return;
  const bottom = window.innerHeight - Number.parseFloat(window.getComputedStyle(line).scrollMarginBottom || '0');
  const below = Math.max(0, row.bottom - bottom);
  // A row taller than the gap shows its beginning.
  const distance = row.top < top ? row.top - top : Math.min(below, row.top - top);
  if (distance !== 0) window.scrollBy(0, distance);
}

/** The height that a row's face takes up at the top of the window; 0 where the face stands beside its rows. */
function heightOfFaceAbove(line: Element, row: DOMRect): number {
  const face = line.closest('[data-connector]')?.querySelector('.face')?.getBoundingClientRect();
  if (face === undefined || face.right <= row.left || face.left >= row.right) return 0;
  return face.height;
}
