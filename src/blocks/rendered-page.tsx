import { useEffect, useRef, useState, type ReactElement } from 'react';
import { useLocation, useNavigate } from 'react-router';
import { keepPlace, keepsPlace } from '../lib/keep-place.ts';
import { useHydrated } from '../lib/use-hydrated.ts';
import { Button } from '../ui/button.tsx';
import { LinkSign } from '../ui/signs.tsx';
import { cavityTowards, faceOf, isArrow, turnOver } from './face-keys.ts';
import { lineAt, lineNamed, markLine, showLine } from './marked-line.ts';

interface RenderedPageProps {
  /** Whose HTML it is: a page's address, or a proposal's id. At hydration the HTML is read from here. */
  readonly of: string;
  /** Safe HTML, as the book rendered it. */
  readonly html: string;
}

/**
 * A page's text with its drawings. React holds it as one opaque piece; what moves in it is brought to life by handlers
 * on the whole: it can be read, jumped in and turned over before they arrive and without them.
 */
export function RenderedPage({ of, html }: RenderedPageProps): ReactElement {
  const element = useRef<HTMLDivElement>(null);
  useInnerLinks(element);
  useFaceKeys(element);
  const marked = useMarkedLine(element, html);
  return (
    <>
      {/* The browser writes the same HTML out in its own way; the server's is the one that counts. */}
      <div
        ref={element}
        className="reading"
        data-html-of={of}
        dangerouslySetInnerHTML={{ __html: html }}
        suppressHydrationWarning
      />
      {marked === null ? null : <LineStrip line={marked} />}
    </>
  );
}

type Held = React.RefObject<HTMLDivElement | null>;

/** Links inside the text lead through the router, and a cavity marks its line without a jump. */
function useInnerLinks(element: Held): void {
  const navigate = useNavigate();
  useEffect(() => {
    if (element.current === null) return;
    const root: HTMLElement = element.current;
    function follow(event: MouseEvent): void {
      if (
        event.defaultPrevented ||
        event.button !== 0 ||
        event.metaKey ||
        event.ctrlKey ||
        event.shiftKey ||
        event.altKey
      )
        return;
      if (!(event.target instanceof Element)) return;
      const link = event.target.closest('a');
      if (link === null) {
        const line = event.target.closest('tr.line');
        // A row is chosen by a tap, but not where somebody has selected its words.
        if (line === null || line.id === '' || window.getSelection()?.isCollapsed === false) return;
        if (event.target.closest('button, input, label, summary') === null) choose(`#${encodeURI(line.id)}`);
        return;
      }
      const href = link.getAttribute('href') ?? '';
      if (link.hasAttribute('target') || link.hasAttribute('download')) return;
      if (href.startsWith('#')) {
        event.preventDefault();
        if (lineAt(root, href) === null) void navigate({ search: window.location.search, hash: href });
        else choose(href);
      } else if (href.startsWith('/') && !href.startsWith('//') && !/^\/(?:api|photos)\//.test(href)) {
        event.preventDefault();
        void navigate(href);
      }
    }
    function choose(href: string): void {
      void navigate({ search: window.location.search, hash: href }, { state: keepPlace });
    }
    root.addEventListener('click', follow);
    return () => root.removeEventListener('click', follow);
  }, [element, navigate]);
}

/** Arrows go from cavity to cavity as they lie on the face; T turns it over. */
function useFaceKeys(element: Held): void {
  useEffect(() => {
    const root = element.current;
    if (root === null) return;
    function press(event: KeyboardEvent): void {
      if (event.altKey || event.ctrlKey || event.metaKey || !(event.target instanceof Element)) return;
      const face = faceOf(event.target);
      if (face === null) return;
      if (event.key === 't' || event.key === 'T') {
        if (turnOver(face)) event.preventDefault();
      } else if (isArrow(event.key)) {
        const next = cavityTowards(face, event.target, event.key);
        if (next === null) return;
        event.preventDefault();
        next.focus();
      }
    }
    root.addEventListener('keydown', press);
    return () => root.removeEventListener('keydown', press);
  }, [element]);
}

/** Marks the line that the address names, and gives its name; null where the address names none on this page. */
function useMarkedLine(element: Held, html: string): string | null {
  const { hash, state } = useLocation();
  const hydrated = useHydrated();
  const inPlace = keepsPlace(state);
  useEffect(() => {
    if (element.current === null) return;
    const line = markLine(element.current, hash);
    if (line !== null && inPlace) showLine(line);
  }, [element, hash, html, inPlace]);
  return hydrated ? lineNamed(hash, html) : null;
}

function LineStrip({ line }: { readonly line: string }): ReactElement {
  const [copied, setCopied] = useState<string | null>(null);
  const navigate = useNavigate();
  async function copy(): Promise<void> {
    try {
      await navigator.clipboard.writeText(window.location.href);
      setCopied(line);
    } catch {
      setCopied(null);
    }
  }
  return (
    <div className="line-strip unprinted" role="status">
      <b>{line}</b>
      <Button type="button" className="line-strip-do" onClick={() => void copy()}>
        <LinkSign /> {copied === line ? 'Copied' : 'Copy link'}
      </Button>
      <Button
        type="button"
        className="line-strip-do"
        onClick={() => void navigate({ search: window.location.search, hash: '' }, { state: keepPlace })}
      >
        Unmark
      </Button>
    </div>
  );
}
