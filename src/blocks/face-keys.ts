/* The keyboard on a connector's face, in HTML that the dialect rendered. */

const arrows = { ArrowLeft: [-1, 0], ArrowRight: [1, 0], ArrowUp: [0, -1], ArrowDown: [0, 1] } as const;

export type Arrow = keyof typeof arrows;

export function isArrow(key: string): key is Arrow {
  return key in arrows;
}

/** The face that an element stands on; null where it stands on none. */
export function faceOf(element: Element): Element | null {
  return element.closest('.face');
}

/** Turns a face over by the box that does so without a script, too. False where the face has none. */
export function turnOver(face: Element): boolean {
  const box = face.querySelector('input.face-turn');
  if (!(box instanceof HTMLInputElement)) return false;
  const current = face.ownerDocument.activeElement?.getAttribute('data-cavity') ?? null;
  box.checked = !box.checked;
  box.dispatchEvent(new Event('change', { bubbles: true }));
  // Whoever was on a cavity stays on it, on the side that is now up.
  const same = visibleCavities(face).find((cavity) => cavity.getAttribute('data-cavity') === current);
  same?.focus();
  return true;
}

/** The next cavity in an arrow's direction from the one that has the focus; null where there is none further. */
export function cavityTowards(face: Element, from: Element, arrow: Arrow): SVGElement | HTMLElement | null {
  const start = from.closest('[data-cavity]');
  if (start === null) return null;
  const [across, down] = arrows[arrow];
  const here = centreOf(start);
  let best: { readonly cavity: SVGElement | HTMLElement; readonly cost: number } | null = null;
  for (const cavity of visibleCavities(face)) {
    if (cavity === start) continue;
    const there = centreOf(cavity);
    const along = (there.x - here.x) * across + (there.y - here.y) * down;
    const aside = Math.abs((there.x - here.x) * down) + Math.abs((there.y - here.y) * across);
    // What lies more to the side than ahead is in another direction.
    if (along <= 0 || aside > 2 * along) continue;
    const cost = along + 2 * aside;
    if (best === null || cost < best.cost) best = { cavity, cost };
  }
  return best?.cavity ?? null;
}

function visibleCavities(face: Element): (SVGElement | HTMLElement)[] {
  return [...face.querySelectorAll('a[data-cavity]')].filter(
    (cavity): cavity is SVGElement | HTMLElement =>
      (cavity instanceof SVGElement || cavity instanceof HTMLElement) && cavity.getClientRects().length > 0,
  );
}

function centreOf(element: Element): { readonly x: number; readonly y: number } {
  const { left, top, width, height } = element.getBoundingClientRect();
  return { x: left + width / 2, y: top + height / 2 };
}
