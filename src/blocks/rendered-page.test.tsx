// @vitest-environment jsdom
import { cleanup, configure, render, screen, waitFor, within } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { RenderedPage } from './rendered-page.tsx';

// A busy machine is slow, not wrong.
configure({ asyncUtilTimeout: 15_000 });

/** What the dialect gives for a connector of three cavities, cut down to what the handlers go by. */
const html = `
<p><a href="/donors/qf550/quirks">quirks</a> <a href="#s-bars">bars</a></p>
<section class="block connector" id="headlight" data-connector="headlight">
  <figure class="face">
    <input type="checkbox" class="face-turn" id="turn-headlight"><label for="turn-headlight">Turn over</label>
    ${['seen', 'turned']
      .map(
        (side) =>
          `<svg class="face-side face-${side}">${[1, 2, 3]
            .map(
              (n) =>
                `<a href="#headlight.${String(n)}" data-cavity="${String(n)}" data-seat="${String(n)}" data-testid="${side}-${String(n)}"></a>`,
            )
            .join('')}</svg>`,
      )
      .join('')}
  </figure>
  <table><tbody>
    ${['1', '2', '2+', '3']
      .map(
        (name) =>
          `<tr id="headlight.${name}" class="line" data-line="headlight.${name}" data-cavity="${name.replace('+', '')}"><td>cavity ${name}</td></tr>`,
      )
      .join('')}
  </tbody></table>
</section>
<h2 id="s-bars">Bars</h2>`;

function open(address = '/donors/qf550/pinouts?year=1980') {
  const router = createMemoryRouter(
    [
      { path: '/donors/qf550/pinouts', element: <RenderedPage of="donors/qf550/pinouts" html={html} /> },
      { path: '*', element: <p>elsewhere</p> },
    ],
    { initialEntries: [address] },
  );
  render(<RouterProvider router={router} />);
  return { router, user: userEvent.setup() };
}

function markedLines(): string[] {
  return [...document.querySelectorAll('.line-marked')].map(({ id }) => id);
}

function ringedCavities(): (string | undefined)[] {
  return [...document.querySelectorAll<HTMLElement>('.ringed')].map((cavity) => cavity.dataset['testid']);
}

beforeEach(() => {
  window.history.replaceState(null, '', '/donors/qf550/pinouts?year=1980');
});

afterEach(() => {
  cleanup();
});

describe('a rendered page', () => {
  it('marks the line that its address names and rings its cavity on both sides', async () => {
    open('/donors/qf550/pinouts#headlight.2+');
    await waitFor(() => expect(markedLines()).toEqual(['headlight.2+']));
    expect(ringedCavities()).toEqual(['seen-2', 'turned-2']);
    expect(within(screen.getByRole('status')).getByText('headlight.2+')).toBeDefined();
  });

  it('marks the row of a cavity that is tapped', async () => {
    const { router, user } = open();
    await user.click(screen.getByTestId('seen-3'));
    await waitFor(() => expect(markedLines()).toEqual(['headlight.3']));
    expect(router.state.location).toMatchObject({ search: '?year=1980', hash: '#headlight.3' });
  });

  it('marks one line at a time, and goes back to the one before', async () => {
    const { router, user } = open();
    await user.click(screen.getByTestId('seen-1'));
    await user.click(screen.getByTestId('seen-2'));
    await waitFor(() => expect(markedLines()).toEqual(['headlight.2']));
    await router.navigate(-1);
    await waitFor(() => expect(markedLines()).toEqual(['headlight.1']));
    expect(ringedCavities()).toEqual(['seen-1', 'turned-1']);
  });

  it('marks a row that is tapped itself, and can be unmarked', async () => {
    const { router, user } = open();
    await user.click(screen.getByText('cavity 3'));
    await waitFor(() => expect(ringedCavities()).toEqual(['seen-3', 'turned-3']));
    await user.click(screen.getByRole('button', { name: 'Unmark' }));
    await waitFor(() => expect(markedLines()).toEqual([]));
    expect(router.state.location.hash).toBe('');
    expect(screen.queryByRole('status')).toBeNull();
  });

  it('gives away the address of the marked line', async () => {
    const { user } = open('/donors/qf550/pinouts#headlight.1');
    await user.click(await screen.findByRole('button', { name: 'Copy link' }));
    expect(await screen.findByRole('button', { name: 'Copied' })).toBeDefined();
    expect(await navigator.clipboard.readText()).toBe(window.location.href);
  });

  it('leads to other pages and to its own sections through the router', async () => {
    const { router, user } = open();
    await user.click(screen.getByText('bars'));
    expect(router.state.location).toMatchObject({ pathname: '/donors/qf550/pinouts', hash: '#s-bars' });
    expect(markedLines()).toEqual([]);
    await user.click(screen.getByText('quirks'));
    expect(await screen.findByText('elsewhere')).toBeDefined();
  });

  it('leaves a click with a modifier to the browser', async () => {
    const { router, user } = open();
    const opened = vi.fn((event: Event) => event.preventDefault());
    document.addEventListener('click', opened);
    await user.keyboard('{Control>}');
    await user.click(screen.getByText('quirks'));
    document.removeEventListener('click', opened);
    expect(opened).toHaveBeenCalledOnce();
    expect(router.state.location.pathname).toBe('/donors/qf550/pinouts');
  });

  it('turns a face over by its box and by the key T', async () => {
    const { user } = open();
    const box = screen.getByRole<HTMLInputElement>('checkbox', { name: 'Turn over' });
    await user.click(box);
    expect(box.checked).toBe(true);
    screen.getByTestId('turned-2').focus();
    await user.keyboard('t');
    expect(box.checked).toBe(false);
  });

  it('goes from cavity to cavity by the arrows, as they lie on the face', async () => {
    const { user } = open();
    const places: Readonly<Record<string, readonly [number, number]>> = {
      'seen-1': [0, 0],
      'seen-2': [50, 0],
      'seen-3': [25, 60],
    };
    for (const [id, [left, top]] of Object.entries(places)) {
      const box = new DOMRect(left, top, 40, 40);
      const cavity = screen.getByTestId(id);
      cavity.getBoundingClientRect = () => box;
      cavity.getClientRects = () => Object.assign([box], { item: () => box });
    }
    screen.getByTestId('seen-1').focus();
    await user.keyboard('{ArrowRight}');
    expect(document.activeElement).toBe(screen.getByTestId('seen-2'));
    await user.keyboard('{ArrowDown}');
    expect(document.activeElement).toBe(screen.getByTestId('seen-3'));
    await user.keyboard('{ArrowDown}');
    expect(document.activeElement).toBe(screen.getByTestId('seen-3'));
    await user.keyboard('{ArrowUp}');
    expect(document.activeElement).toBe(screen.getByTestId('seen-1'));
  });
});
