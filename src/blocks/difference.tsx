import type { ReactElement } from 'react';
import type { DifferenceView } from '../../shared/contracts/views.ts';
import { classNames } from '../ui/class-names.ts';
import {
  cellsOf,
  isTableRule,
  stretchesOf,
  type LineChange,
  type Stretch,
  type WordChange,
} from './difference-stretches.ts';
import { counted } from './words.ts';

/** How many unchanged lines stay in sight on each side of a change. */
const linesAround = 2;

/**
 * What changed from one text to another: the words inside their lines, and a table by its rows. What went is struck
 * through, what came is underlined; both say so to who cannot see it.
 */
export function Difference({ difference }: { readonly difference: DifferenceView }): ReactElement {
  const stretches = stretchesOf(difference.lines, linesAround);
  if (stretches.every(({ kind }) => kind === 'folded')) {
    return <p className="difference-none">The two texts are the same, letter for letter.</p>;
  }
  return (
    <div className="difference">
      {difference.coarse ? (
        <p className="soft">These texts are too long to compare word by word, so whole lines are shown.</p>
      ) : null}
      {stretches.map((stretch) => (
        <StretchOf key={`${stretch.kind}-${String(stretch.index)}`} stretch={stretch} />
      ))}
    </div>
  );
}

function StretchOf({ stretch }: { readonly stretch: Stretch }): ReactElement {
  if (stretch.kind === 'folded') {
    return (
      <details className="difference-folded">
        <summary>{counted(stretch.lines.length, 'line')} the same</summary>
        {stretchesOf(stretch.lines, stretch.lines.length).map((inner) => (
          <StretchOf key={`${inner.kind}-${String(inner.index)}`} stretch={inner} />
        ))}
      </details>
    );
  }
  if (stretch.kind === 'table') return <Rows lines={stretch.lines.filter((line) => !isTableRule(line))} />;
  return (
    <div className="difference-text">
      {stretch.lines.map((line, index) => (
        <p key={`${keyOf(line)}-${String(index)}`} className={classNames('difference-line', `difference-${line.kind}`)}>
          <LineNumber line={line} />
          <span>
            <Words words={line.words} />
          </span>
        </p>
      ))}
    </div>
  );
}

function Rows({ lines }: { readonly lines: readonly LineChange[] }): ReactElement {
  const rows = lines.map((line) => ({ line, cells: cellsOf(line.words) }));
  const columns = Math.max(...rows.map(({ cells }) => cells.length));
  return (
    <div className="difference-table" role="group" aria-label="Rows of a table">
      <table>
        <tbody>
          {rows.map(({ line, cells }, index) => (
            <tr
              key={`${keyOf(line)}-${String(index)}`}
              className={classNames('difference-row', `difference-${line.kind}`)}
            >
              <LineNumber line={line} />
              {cells.map((words, cell) => (
                // A cell has nothing of its own but its place. The last one takes what a shorter row leaves empty.
                <td key={String(cell)} colSpan={cell === cells.length - 1 ? columns - cell : 1}>
                  <Words words={words} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

const kindWords: Readonly<Record<LineChange['kind'], string>> = {
  same: '',
  removed: 'taken out',
  added: 'put in',
  changed: 'changed',
};

function LineNumber({ line }: { readonly line: LineChange }): ReactElement {
  const number = line.toLine ?? line.fromLine;
  const content = (
    <>
      <span className="heard">Line </span>
      {number ?? ''}
      {line.kind === 'same' ? null : <span className="difference-kind"> {kindWords[line.kind]}</span>}
    </>
  );
  return line.table ? (
    <th scope="row" className="difference-number">
      {content}
    </th>
  ) : (
    <span className="difference-number">{content}</span>
  );
}

function Words({ words }: { readonly words: readonly WordChange[] }): ReactElement {
  return (
    <>
      {words.map((word, index) => {
        const key = `${String(index)}-${word.kind}`;
        if (word.kind === 'removed') return <del key={key}>{word.text}</del>;
        if (word.kind === 'added') return <ins key={key}>{word.text}</ins>;
        return <span key={key}>{word.text}</span>;
      })}
    </>
  );
}

function keyOf(line: LineChange): string {
  return `${String(line.fromLine ?? '')}-${String(line.toLine ?? '')}-${line.kind}`;
}
