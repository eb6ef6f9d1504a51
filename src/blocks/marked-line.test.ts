// @vitest-environment jsdom
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { lineAt, lineNamed, showLine } from './marked-line.ts';

const html = `
<div class="reading">
  <section data-connector="plug">
    <figure class="face"></figure>
    <table><tbody><tr id="plug.2~1980-" class="line" data-line="plug.2~1980-" data-cavity="2"><td>2</td></tr></tbody></table>
  </section>
  <h2 id="s-plug">Plug</h2>
</div>
<p id="elsewhere" class="line"></p>`;

function held(selector: string): HTMLElement {
  const found = document.querySelector<HTMLElement>(selector);
  if (found === null) throw new Error(`no ${selector}`);
  return found;
}

beforeEach(() => {
  document.body.innerHTML = html;
});

describe('the line of a fragment', () => {
  it('is the row that it names, however the browser has written it', () => {
    const root = held('.reading');
    expect(lineAt(root, '#plug.2~1980-')?.id).toBe('plug.2~1980-');
    expect(lineAt(root, '#plug.2%7E1980-')?.id).toBe('plug.2~1980-');
    expect(lineNamed('#plug.2~1980-', html)).toBe('plug.2~1980-');
  });

  it.each(['', '#', '#s-plug', '#elsewhere', '#plug.9', '#%E0%A4%A'])('is none for %j', (fragment) => {
    expect(lineAt(held('.reading'), fragment)).toBeNull();
    expect(lineNamed(fragment, html)).toBeNull();
  });
});

describe('bringing a line into sight', () => {
  const height = 800;
  const foot = 100;

  function distanceFor(row: DOMRect, face: DOMRect): number {
    const line = held('.line');
    line.getBoundingClientRect = () => row;
    line.style.scrollMarginBottom = `${String(foot)}px`;
    held('.face').getBoundingClientRect = () => face;
    window.innerHeight = height;
    const scrollBy = vi.fn<(x: number, y: number) => void>();
    window.scrollBy = Object.assign(scrollBy);
    showLine(line);
    return scrollBy.mock.calls[0]?.[1] ?? 0;
  }

  const faceAbove = new DOMRect(0, 0, 390, 300);
  const faceBeside = new DOMRect(0, 0, 300, 300);

  it('moves nothing where the row can be seen', () => {
    expect(distanceFor(new DOMRect(0, 400, 390, 60), faceAbove)).toBe(0);
    expect(distanceFor(new DOMRect(400, 20, 600, 60), faceBeside)).toBe(0);
  });

  it('moves a row out from under its face, and no further', () => {
    expect(distanceFor(new DOMRect(0, 250, 390, 60), faceAbove)).toBe(-50);
  });

  it('moves a row up from behind what stands at the foot', () => {
    expect(distanceFor(new DOMRect(0, 680, 390, 60), faceAbove)).toBe(40);
  });

  it('shows the beginning of a row that is taller than the gap', () => {
    expect(distanceFor(new DOMRect(0, 350, 390, 900), faceAbove)).toBe(50);
  });
});
