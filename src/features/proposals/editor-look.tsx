import type { ReactElement, Ref } from 'react';
import { RenderedPage } from '../../blocks/rendered-page.tsx';
import { Notice } from '../../ui/notice.tsx';
import { FindingsList, findingsWords } from './findings-list.tsx';
import { leadApart } from './lead-apart.ts';
import type { LivePreview } from './use-preview.ts';

interface EditorLookProps {
  /** The heading of what was found, to go to. */
  readonly ref: Ref<HTMLHeadingElement>;
  readonly preview: LivePreview;
  readonly onLine: ((line: number) => void) | undefined;
  /** True where the text is looked over as it is typed. */
  readonly alive: boolean;
}

/** What the book makes of a text that is being written: what it finds, and how the page will look. */
export function EditorLook({ ref, preview, onLine, alive }: EditorLookProps): ReactElement {
  const { read, problem, current } = preview;
  return (
    <section className="editor-look" aria-label="What the book makes of it">
      <h2 ref={ref} id="what_is_found" tabIndex={-1}>
        What the book finds
      </h2>
      <p className="soft small" role="status">
        {statusWords(preview, alive)}
      </p>
      {problem === null ? null : (
        <Notice look={problem.status === 429 || problem.status === 503 ? 'hint' : 'stop'} title={problem.title}>
          <p>{problem.detail}</p>
          {problem.status === 429 || problem.status === 503 ? <p>It is asked again by itself; go on writing.</p> : null}
        </Notice>
      )}
      {read === null ? null : (
        <div className={current ? undefined : 'editor-outdated'}>
          <FindingsList findings={read.view.findings} markdown={read.markdown} onLine={onLine} />
          <h2 id="how_it_will_look">How the page will look</h2>
          <div className="proposed-page" onClickCapture={leadApart}>
            <RenderedPage of="preview" html={read.view.html} />
          </div>
        </div>
      )}
    </section>
  );
}

function statusWords({ read, problem, current }: LivePreview, alive: boolean): string {
  if (!alive && read === null) {
    return '“Look it over” shows here what the book finds in the text, and how the page will look. Nothing is kept or sent by it.';
  }
  if (read === null) return problem === null ? 'Reading …' : '';
  if (current) return `Of the text as it stands: ${findingsWords(read.view.findings)}.`;
  return problem === null ? 'Reading what you wrote …' : 'Below is the last text that could be read.';
}
