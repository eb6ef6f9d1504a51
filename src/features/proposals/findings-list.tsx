import type { ReactElement } from 'react';
import { Link } from 'react-router';
import type { PreviewView } from '../../../shared/contracts/views.ts';
import type { Severity } from '../../../shared/pages/finding.ts';
import { counted } from '../../blocks/words.ts';

export type FindingView = PreviewView['findings'][number];

interface FindingsListProps {
  readonly findings: readonly FindingView[];
  /** The text that they are of, to show the line that each is about. */
  readonly markdown: string;
  /** Goes to a line of the text; absent where there is nothing to go to. */
  readonly onLine?: ((line: number) => void) | undefined;
  /** Where a line's address leads: into the page as it will look. */
  readonly linked?: boolean;
}

const severityWords: Readonly<Record<Severity, string>> = {
  stop: 'Stops it',
  warn: 'Look at it',
  hint: 'Hint',
};
const order: readonly Severity[] = ['stop', 'warn', 'hint'];

/** What the book noticed in a text: what stops it first, each kind in the order of the lines. */
export function FindingsList({ findings, markdown, onLine, linked = false }: FindingsListProps): ReactElement {
  if (findings.length === 0) return <p>The book finds nothing wrong with this text.</p>;
  const lines = markdown.split('\n');
  const sorted = findings.toSorted((a, b) => order.indexOf(a.severity) - order.indexOf(b.severity) || a.line - b.line);
  return (
    <ol className="findings">
      {sorted.map((finding, index) => (
        <li key={`${String(index)}-${finding.code}`} className={`finding finding-${finding.severity}`}>
          <p>
            <b>{severityWords[finding.severity]}:</b> <Message text={finding.message} />
          </p>
          {finding.path === undefined ? null : <p className="finding-path">{finding.path.join(' → ')}</p>}
          {finding.applies === undefined ? null : <p className="soft">Only for {finding.applies}.</p>}
          <p className="finding-place">
            <LinePlace line={finding.line} onLine={onLine} />
            {linked && finding.address?.startsWith('#') === true ? (
              <Link to={encodeURI(finding.address)}>{finding.address.slice(1)}</Link>
            ) : null}
            <LineText text={lines[finding.line - 1] ?? ''} />
          </p>
        </li>
      ))}
    </ol>
  );
}

/** A finding's sentence, with what it quotes of the text set apart. */
function Message({ text }: { readonly text: string }): ReactElement {
  return (
    <>
      {text.split('`').map((part, index) => {
        const key = `${String(index)}-${part}`;
        return index % 2 === 1 ? <code key={key}>{part}</code> : <span key={key}>{part}</span>;
      })}
    </>
  );
}

interface LinePlaceProps {
  readonly line: number;
  readonly onLine: ((line: number) => void) | undefined;
}

function LinePlace({ line, onLine }: LinePlaceProps): ReactElement {
  if (onLine === undefined) return <span>Line {line}</span>;
  return (
    <button type="button" className="finding-go" onClick={() => onLine(line)}>
      Go to line {line}
    </button>
  );
}

function LineText({ text }: { readonly text: string }): ReactElement | null {
  return text.trim() === '' ? null : <code className="finding-text">{text}</code>;
}

/** How many findings there are of each severity, in a phrase. */
export function findingsWords(findings: readonly FindingView[]): string {
  const counts = order.map((severity) => findings.filter((finding) => finding.severity === severity).length);
  const [stops = 0, warnings = 0, hints = 0] = counts;
  const said = [
    stops > 0 ? `${counted(stops, 'finding stops', 'findings stop')} it` : '',
    warnings > 0 ? `${counted(warnings, 'line', 'lines')} to look at` : '',
    hints > 0 ? counted(hints, 'hint') : '',
  ].filter((part) => part !== '');
  return said.length === 0 ? 'nothing to mend' : said.join(', ');
}
