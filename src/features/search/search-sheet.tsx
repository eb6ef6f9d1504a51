import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef, useState, type FormEvent, type KeyboardEvent, type ReactElement } from 'react';
import { Form, useLoaderData, useLocation, useNavigate } from 'react-router';
import type { SearchView } from '../../../shared/contracts/views.ts';
import { variantWords } from '../../lib/bench.ts';
import { counted } from '../../blocks/words.ts';
import { paths } from '../../lib/paths.ts';
import { searchQuery } from '../../lib/queries.ts';
import { useApi } from '../../lib/use-api.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { PageHead } from '../../ui/page-head.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { AnswerList, answerLinks } from './answer-list.tsx';
import { pageSearchClient } from './search-client.ts';
import { NothingAsked, NothingFound } from './search-examples.tsx';
import { longestQuery, type searchLoader } from './search-loader.ts';
import { useAnswers, type Answers } from './use-answers.ts';
import { useSearchStatus } from './use-search-status.ts';
import { useSlash } from './use-slash.ts';

/** The address follows what is typed once it has settled: browsers count changes of it. */
const addressMilliseconds = 300;

/** The search: the field, and the answer itself under it. */
export function SearchSheet(): ReactElement {
  const { query, bench } = useLoaderData<typeof searchLoader>();
  const first = useQueryClient().getQueryData(searchQuery(useApi(), query, bench).queryKey) ?? null;
  const [typed, setTyped] = useTyped(query);
  const answers = useAnswers(typed, bench, first);
  useIndex();
  useAddress(typed, query);
  const bike = variantWords(bench.variant);
  const { view } = answers;
  return (
    <Sheet title="Find">
      <PageHead title={`${typed.trim() === '' ? 'Find' : typed.trim()} · Earthstrap`} listed={false} />
      <SheetField typed={typed} onType={setTyped} />
      <Standing answers={answers} typed={typed} />
      {view === null || typed.trim() === '' ? null : <Remarks view={view} bike={bike} />}
      {typed.trim() === '' ? <NothingAsked /> : null}
      {view !== null && typed.trim() !== '' && view.hits.length === 0 ? <NothingFound query={view.query} /> : null}
      {view === null ? null : <AnswerList hits={view.hits} />}
    </Sheet>
  );
}

function SheetField({
  typed,
  onType,
}: {
  readonly typed: string;
  readonly onType: (text: string) => void;
}): ReactElement {
  const field = useRef<HTMLInputElement>(null);
  const navigate = useNavigate();
  useSlash(field);
  function submit(event: FormEvent): void {
    event.preventDefault();
    void navigate(paths.search(typed.trim()));
  }
  function toAnswers(event: KeyboardEvent<HTMLInputElement>): void {
    if (event.key === 'ArrowDown') {
      const [link] = answerLinks();
      if (link === undefined) return;
      event.preventDefault();
      link.focus();
    } else if (event.key === 'Escape' && typed !== '') {
      event.preventDefault();
      onType('');
    }
  }
  return (
    <Form role="search" aria-label="Search" action={paths.search()} className="search-form" onSubmit={submit}>
      <input
        ref={field}
        className="field-control search-input"
        name="q"
        type="search"
        value={typed}
        maxLength={longestQuery}
        autoComplete="off"
        autoCapitalize="none"
        spellCheck={false}
        enterKeyHint="search"
        aria-label="What are you looking for?"
        aria-describedby="search-standing"
        data-search-field="sheet"
        onChange={(event) => onType(event.target.value)}
        onKeyDown={toAnswers}
      />
      <Button look="primary">Find</Button>
    </Form>
  );
}

/** How many answers there are, and what stands in the way of better ones; read out as it changes. */
function Standing({ answers, typed }: { readonly answers: Answers; readonly typed: string }): ReactElement {
  const { network, lines, prose } = useSearchStatus();
  const { view, source, unanswered } = answers;
  const asked = typed.trim();
  const sentences = [
    asked === '' || view === null
      ? null
      : view.hits.length === 0
        ? 'No answers.'
        : `${counted(view.hits.length, 'answer')}.`,
    source === 'server' && lines === null && network === 'reached'
      ? 'The server answered: the index is still loading.'
      : null,
    source === 'index' && prose === null ? 'Lines and headings so far: the text is still loading.' : null,
  ].filter((sentence) => sentence !== null);
  return (
    <>
      <p id="search-standing" className="search-standing soft" role="status">
        {sentences.join(' ')}
      </p>
      {network === 'unreachable' && lines !== null ? (
        <Notice look="warn" title="The network is gone">
          <p>
            These answers are from the copy of the book that this browser holds. News will come when the network does.
          </p>
        </Notice>
      ) : null}
      {unanswered ? (
        <Notice look="stop" title="The search cannot be reached" live>
          <p>
            What you have typed is still here. See whether there is a connection, then change a letter or press Find.
          </p>
        </Notice>
      ) : null}
    </>
  );
}

function Remarks({ view, bike }: { readonly view: SearchView; readonly bike: string | null }): ReactElement | null {
  const remarks = bike === null || view.bench === null ? view.remarks : [...view.remarks, `Your bike: ${bike}.`];
  if (remarks.length === 0) return null;
  return (
    <ul className="search-remarks">
      {remarks.map((remark) => (
        <li key={remark}>{remark}</li>
      ))}
    </ul>
  );
}

/** What is typed: the address's question, until something is typed over it; a new address is a new question. */
function useTyped(query: string): [string, (text: string) => void] {
  const { key } = useLocation();
  const [state, setState] = useState({ key, typed: query });
  if (state.key !== key) setState({ key, typed: query });
  return [state.key === key ? state.typed : query, (typed) => setState({ key, typed })];
}

/** On this sheet the index is wanted at once. */
function useIndex(): void {
  useEffect(() => pageSearchClient().start(), []);
}

/** Keeps the address in step with what is typed, without asking the router for a new sheet at each letter. */
function useAddress(typed: string, query: string): void {
  useEffect(() => {
    if (typed === query) return;
    const settled = setTimeout(() => {
      const address = new URL(window.location.href);
      if (typed.trim() === '') address.searchParams.delete('q');
      else address.searchParams.set('q', typed.trim());
      window.history.replaceState(window.history.state, '', address);
    }, addressMilliseconds);
    return () => clearTimeout(settled);
  }, [typed, query]);
}
