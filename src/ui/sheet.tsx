import { useEffect, useRef, useState, type MouseEvent, type ReactElement, type ReactNode } from 'react';
import { useNavigate } from 'react-router';
import { classNames } from './class-names.ts';

/** A section of a sheet: its anchor and its heading. */
export interface SheetSection {
  readonly id: string;
  readonly text: string;
}

interface SheetProps {
  readonly title: string;
  /** One line above the title: what sheet it is. */
  readonly line?: ReactNode;
  readonly lead?: ReactNode;
  /** What stands beside the title where there is room, and under it where there is not. */
  readonly beside?: ReactNode;
  /** The sections in the order in which they stand, for the letters along the edge. */
  readonly sections?: readonly SheetSection[];
  readonly children?: ReactNode;
  readonly foot?: ReactNode;
}

/** A sheet: letters along its edge, a line at the head, the title, what is on it, and what stands at its foot. */
export function Sheet({ title, line, lead, beside, sections = [], children, foot }: SheetProps): ReactElement {
  const lettered = sections.length > 1;
  return (
    <main id="sheet" tabIndex={-1} className={classNames('sheet', lettered && 'sheet-lettered')}>
      {lettered ? <SheetLetters sections={sections} /> : null}
      <div className="sheet-field">
        {line}
        <div className={classNames('sheet-head', beside !== undefined && 'sheet-head-beside')}>
          <div className="sheet-title">
            <h1 tabIndex={-1}>{title}</h1>
            {lead === undefined || lead === null ? null : <p className="sheet-lead">{lead}</p>}
          </div>
          {beside === undefined ? null : <div className="sheet-beside">{beside}</div>}
        </div>
        <div className="sheet-body">{children}</div>
        {foot ?? <div className="sheet-end" />}
      </div>
    </main>
  );
}

/** A, B … Z, AA, as the style sheet's counter writes them beside the headings. */
export function letterOf(index: number): string {
  const letter = String.fromCharCode(65 + (index % 26));
  return index < 26 ? letter : letterOf(Math.floor(index / 26) - 1) + letter;
}

function SheetLetters({ sections }: { readonly sections: readonly SheetSection[] }): ReactElement {
  const current = useCurrentSection(sections);
  const navigate = useNavigate();
  function jump(event: MouseEvent<HTMLAnchorElement>): void {
    if (event.button !== 0 || event.metaKey || event.ctrlKey || event.shiftKey || event.altKey) return;
    event.preventDefault();
    // Through the router, so that going back finds the place again; with whatever the address asks for.
    void navigate({ search: window.location.search, hash: event.currentTarget.hash });
  }
  return (
    <nav className="sheet-letters" aria-label="Sections of this sheet">
      <ol>
        {sections.map((section, index) => (
          <li key={section.id}>
            <a
              href={`#${encodeURI(section.id)}`}
              aria-current={current === section.id ? 'true' : undefined}
              onClick={jump}
            >
              {letterOf(index)}
              <span>{section.text}</span>
            </a>
          </li>
        ))}
      </ol>
    </nav>
  );
}

/** The last section whose heading has passed the upper third of the window. */
function useCurrentSection(sections: readonly SheetSection[]): string | null {
  const [current, setCurrent] = useState<string | null>(null);
  const passed = useRef(new Set<string>());
  useEffect(() => {
    if (typeof IntersectionObserver === 'undefined') return;
    const above = passed.current;
    above.clear();
    const observer = new IntersectionObserver(
      (entries) => {
        for (const { target, boundingClientRect, rootBounds } of entries) {
          if (boundingClientRect.top < (rootBounds?.bottom ?? 0)) above.add(target.id);
          else above.delete(target.id);
        }
        setCurrent(sections.filter(({ id }) => above.has(id)).at(-1)?.id ?? null);
      },
      { rootMargin: '0px 0px -66% 0px' },
    );
    for (const { id } of sections) {
      const heading = document.getElementById(id);
      if (heading !== null) observer.observe(heading);
    }
    return () => observer.disconnect();
  }, [sections]);
  return current;
}

interface SectionProps {
  readonly id: string;
  readonly title: string;
  readonly children: ReactNode;
}

/** A section of a sheet, with its letter. */
export function Section({ id, title, children }: SectionProps): ReactElement {
  return (
    <section className="sheet-section" aria-labelledby={id}>
      <h2 id={id} className="lettered">
        {title}
      </h2>
      {children}
    </section>
  );
}

/** A sheet's section that is not lettered, for sheets that have one or two. */
export function PlainSection({ id, title, children }: SectionProps): ReactElement {
  return (
    <section className="sheet-section" aria-labelledby={id}>
      <h2 id={id}>{title}</h2>
      {children}
    </section>
  );
}

/** Says what belongs in an empty place and offers the first step. */
export function EmptyPlace({ children }: { readonly children: ReactNode }): ReactElement {
  return <div className="empty-place">{children}</div>;
}
