import type { Site } from '../../server/http/ssr-site.ts';
import { isShelf } from '../../shared/pages/address.ts';

type Render = Site['render'];
type Rendered = Awaited<ReturnType<Render>>;

function page(status: number, body: string, keepable = false): Rendered {
  return { kind: 'page', status, headers: new Headers(), head: '<title>A page</title>', body, state: '', keepable };
}

async function takeForm(request: Request, { api }: Parameters<Render>[1]): Promise<Rendered> {
  const { pathname } = new URL(request.url);
  if (pathname === '/sign-out') {
    await api.signOut();
    return { kind: 'response', response: new Response(null, { status: 302, headers: { location: '/' } }) };
  }
  const form = await request.formData();
  const signedIn = await api.signIn({ email: String(form.get('email')), password: String(form.get('password')) });
  if (!signedIn.ok) return page(signedIn.refusal.status, `<p>${signedIn.refusal.title}</p>`);
  const headers = new Headers({ location: '/' });
  headers.append('set-cookie', 'bench=testbike-500; Path=/');
  return { kind: 'response', response: new Response(null, { status: 302, headers }) };
}

/**
 * A site of a few plain pages, for tests of what carries pages over HTTP. `/donors/{donor}` shows its title, for whom
 * and for which bench; `/broken` throws; forms sign in and out.
 */
export function createPlainSite(): Site & { readonly rendered: string[] } {
  const rendered: string[] = [];
  return {
    rendered,
    async render(request, options) {
      const { pathname, search } = new URL(request.url);
      rendered.push(`${request.method} ${pathname}${search}`);
      if (request.method === 'POST') return takeForm(request, options);
      if (pathname === '/broken') throw new Error('this page is broken');
      const [, shelf = '', subject = ''] = pathname.split('/');
      const viewer = await options.api.viewer();
      const name = viewer.ok ? (viewer.value.member?.name ?? null) : null;
      if (!isShelf(shelf))
        return page(
          pathname === '/' ? 200 : 404,
          `<p>Hello ${name ?? 'visitor'}</p>`,
          pathname === '/' && name === null,
        );
      const found = await options.api.subject({ shelf, subject });
      if (!found.ok) return page(found.refusal.status, `<p>${found.refusal.title}</p>`);
      const bench = `${options.bench ?? 'nothing'} ${String(options.variant.year ?? 'any year')}`;
      const words = `<h1>${found.value.summary.title}</h1><p>for ${name ?? 'visitor'}, bench ${bench}, asked ${search}</p>`;
      return page(200, words + '<p>Long enough to be compressed. </p>'.repeat(40), name === null);
    },
    template: async () =>
      '<html><head><!--head--></head><body><!--page--><!--state--><script type="module" src="/a.js"></script></body></html>',
    middleware: null,
    nonce: null,
    close: async () => {},
  };
}
