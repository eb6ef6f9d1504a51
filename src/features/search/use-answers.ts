import { useEffect, useState } from 'react';
import type { SearchView } from '../../../shared/contracts/views.ts';
import type { Bench } from '../../lib/bench.ts';
import { useApi } from '../../lib/use-api.ts';
import { pageSearchClient } from './search-client.ts';
import { useSearchStatus } from './use-search-status.ts';

/** The newest answer to what is typed, and where it came from. */
export interface Answers {
  readonly view: SearchView | null;
  /** This browser's own index, or the server while that is still loading. */
  readonly source: 'index' | 'server' | null;
  /** True where neither could answer. */
  readonly unanswered: boolean;
}

/** Typing is let settle so long before the server is asked; the index is asked at every key. */
const settleMilliseconds = 220;
const nothing: Answers = { view: null, source: null, unanswered: false };

/**
 * Answers to a query as it is typed, and again whenever the index has changed. Until a new answer is there the last one
 * stays: its view says which query it is of.
 * @param query as typed; nothing is asked for an empty one
 * @param first what is known already of one query
 */
export function useAnswers(query: string, bench: Bench, first: SearchView | null): Answers {
  const api = useApi();
  const { lines, prose } = useSearchStatus();
  const [latest, setLatest] = useState<Answers>(nothing);
  const asked = query.trim();
  const { donor } = bench;
  const { year, market, frame } = bench.variant;
  const isKnown = first !== null && first.query.trim() === asked;

  useEffect(() => {
    if (asked === '') return;
    let superseded = false;
    const show = (answers: Answers): void => {
      if (!superseded) setLatest(answers);
    };
    const variant = { year, market, frame };
    let settled: ReturnType<typeof setTimeout> | undefined;
    if (lines !== null) {
      void pageSearchClient()
        .ask({ query: asked, bench: { donor, variant } })
        .then((view) => {
          if (view !== null) show({ view, source: 'index', unanswered: false });
        });
    } else if (!isKnown) {
      settled = setTimeout(() => {
        void api.search(asked, donor, variant).then((answer) => {
          show(
            answer.ok ? { view: answer.value, source: 'server', unanswered: false } : { ...nothing, unanswered: true },
          );
        });
      }, settleMilliseconds);
    }
    return () => {
      superseded = true;
      clearTimeout(settled);
    };
  }, [api, asked, donor, year, market, frame, isKnown, lines, prose]);

  if (asked === '') return nothing;
  if (latest.view?.query.trim() === asked || (latest.unanswered && !isKnown)) return latest;
  return isKnown ? { view: first, source: 'server', unanswered: false } : latest;
}
