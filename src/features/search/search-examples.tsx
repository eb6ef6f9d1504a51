import type { ReactElement } from 'react';
import { Link } from 'react-router';
import { paths } from '../../lib/paths.ts';
import { EmptyPlace } from '../../ui/sheet.tsx';

/** Four ways to ask, each of which a garage asks every week. */
const examples = [
  { query: 'yellow red headlight', asks: 'a colour and a place' },
  { query: 'headlight cavity 3', asks: 'a cavity' },
  { query: 'starter relay earth', asks: 'a circuit' },
  { query: 'how to measure a pickup', asks: 'the text' },
] as const;

/** What stands where nothing has been asked yet. */
export function NothingAsked(): ReactElement {
  return (
    <EmptyPlace>
      <p>Ask as you would ask somebody at the next bench. Any spelling of a colour will do.</p>
      <ExampleQueries />
    </EmptyPlace>
  );
}

/** What stands where nothing was found, with what was asked. */
export function NothingFound({ query }: { readonly query: string }): ReactElement {
  return (
    <EmptyPlace>
      <p>
        Nothing in the book answers <b>{query}</b>. If it is a wire that you have in your hand, nobody has written it
        down yet: open the page of its connector and propose the line, or ask in another way.
      </p>
      <ExampleQueries />
    </EmptyPlace>
  );
}

function ExampleQueries(): ReactElement {
  return (
    <ul className="search-examples">
      {examples.map(({ query, asks }) => (
        <li key={query}>
          <Link to={paths.search(query)}>{query}</Link> <span className="soft">by {asks}</span>
        </li>
      ))}
    </ul>
  );
}
