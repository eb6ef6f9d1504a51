import {
  useEffect,
  useId,
  useRef,
  useState,
  type FocusEvent,
  type FormEvent,
  type KeyboardEvent,
  type ReactElement,
} from 'react';
import { Form, useLocation, useNavigate } from 'react-router';
import type { SearchHit } from '../../../shared/contracts/views.ts';
import { emptyBench, readBench, type Bench } from '../../lib/bench.ts';
import { paths } from '../../lib/paths.ts';
import { useHydrated } from '../../lib/use-hydrated.ts';
import { Button } from '../../ui/button.tsx';
import { pageSearchClient } from './search-client.ts';
import { longestQuery } from './search-loader.ts';
import { SearchOption } from './search-option.tsx';
import { useAnswers } from './use-answers.ts';
import { useSlash } from './use-slash.ts';

interface SearchFieldProps {
  /** Where it stands: in the rail above every sheet, or as the question of the front page. */
  readonly placement: 'rail' | 'home';
}

const mostOptions = 7;
const labels = { rail: 'Search the book', home: 'What are you looking for?' } as const;
/** The index is fetched when nothing else is being waited for. */
const idleMilliseconds = 2500;

/**
 * The search field with its likeliest answers under it: a list that arrows move in, Enter opens and Escape closes.
 * Without a script it is a plain form to the search sheet. On that sheet the rail has none, for the sheet has its own.
 */
export function SearchField({ placement }: SearchFieldProps): ReactElement | null {
  const { pathname } = useLocation();
  useIdleStart();
  return placement === 'rail' && pathname === paths.search() ? null : <Field key={pathname} placement={placement} />;
}

function Field({ placement }: SearchFieldProps): ReactElement {
  const [typed, setTyped] = useState('');
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(-1);
  const [bench, setBench] = useState<Bench>(emptyBench);
  const field = useRef<HTMLInputElement>(null);
  const listId = useId();
  const hydrated = useHydrated();
  const navigate = useNavigate();
  useSlash(field);
  const { view } = useAnswers(open ? typed : '', bench, null);
  const hits = view?.hits.slice(0, mostOptions) ?? [];
  const shown = open && typed.trim() !== '' && hits.length > 0;
  const choices = hits.length + 1;

  function type(text: string): void {
    setTyped(text);
    setOpen(true);
    setActive(-1);
  }
  function begin(): void {
    // What is on the bench may have changed since the field was drawn.
    setBench(readBench(document.cookie));
    pageSearchClient().start();
  }
  function go(path: string): void {
    setOpen(false);
    void navigate(path);
  }
  function submit(event: FormEvent): void {
    event.preventDefault();
    const hit = shown ? hits[active] : undefined;
    go(hit === undefined ? paths.search(typed.trim()) : hit.path);
  }
  function move(event: KeyboardEvent<HTMLInputElement>): void {
    if (event.key === 'Escape') {
      if (shown) event.preventDefault();
      setOpen(false);
      setActive(-1);
      return;
    }
    const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
    if (step === 0 || event.altKey || event.ctrlKey || event.metaKey || event.shiftKey) return;
    if (!shown) {
      if (typed.trim() !== '') setOpen(true);
      return;
    }
    event.preventDefault();
    // One place above the first is the field itself, with what was typed.
    setActive((at) => ((at + 1 + step + choices + 1) % (choices + 1)) - 1);
  }
  function leave(event: FocusEvent<HTMLFormElement>): void {
    if (!event.currentTarget.contains(event.relatedTarget)) setOpen(false);
  }

  const optionId = (at: number): string => `${listId}-${String(at)}`;
  const combobox = hydrated
    ? ({
        role: 'combobox',
        'aria-autocomplete': 'list',
        'aria-expanded': shown,
        'aria-controls': listId,
        'aria-activedescendant': shown && active >= 0 ? optionId(active) : undefined,
      } as const)
    : {};
  return (
    <Form
      role="search"
      aria-label={labels[placement]}
      action={paths.search()}
      className="search-form search-field"
      onSubmit={submit}
      onBlur={leave}
    >
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
        aria-label={labels[placement]}
        {...combobox}
        onFocus={begin}
        onChange={(event) => type(event.target.value)}
        onKeyDown={move}
      />
      <Button>Find</Button>
      {hydrated ? (
        <ul id={listId} className="search-options" role="listbox" aria-label="Likeliest answers" hidden={!shown}>
          {shown ? (
            <>
              {hits.map((hit, at) => (
                <SearchOption
                  key={keyOf(hit)}
                  id={optionId(at)}
                  hit={hit}
                  active={at === active}
                  onChoose={() => go(hit.path)}
                />
              ))}
              <SearchOption
                id={optionId(hits.length)}
                hit={null}
                active={active === hits.length}
                onChoose={() => go(paths.search(typed.trim()))}
              />
            </>
          ) : null}
        </ul>
      ) : null}
      <span className="heard" role="status">
        {shown ? `${String(hits.length)} likely answers; arrows choose one.` : ''}
      </span>
    </Form>
  );
}

function keyOf(hit: SearchHit): string {
  return `${hit.kind} ${hit.path}`;
}

/** Starts the index once the page has settled, so that the first key press is answered from it. */
function useIdleStart(): void {
  useEffect(() => {
    const timer = setTimeout(() => pageSearchClient().start(), idleMilliseconds);
    return () => clearTimeout(timer);
  }, []);
}
