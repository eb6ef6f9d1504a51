import { useEffect, useEffectEvent, useState } from 'react';
import type { PreviewBody } from '../../../shared/contracts/bodies.ts';
import type { PreviewView } from '../../../shared/contracts/views.ts';
import type { Problem } from '../../../shared/lib/problem.ts';
import { useApi } from '../../lib/use-api.ts';

/** How long the hands must rest before a text is looked over. */
const restMilliseconds = 400;
/** When a busy book is asked again that does not say when. */
const patienceSeconds = 5;

/** A text that could be read, and what the book makes of it. */
export interface ReadText {
  readonly markdown: string;
  readonly view: PreviewView;
}

export interface LivePreview {
  /** The last text that could be read; null before there is one. */
  readonly read: ReadText | null;
  /** Why the newest text was not read; null where it was, or is still being read. */
  readonly problem: Problem | null;
  /** True where what is shown is of the newest text. */
  readonly current: boolean;
}

interface Answered {
  readonly read: ReadText | null;
  readonly problem: Problem | null;
  readonly of: number | null;
}

/**
 * Looks a text over as it is typed. The last question's answer is the only one that counts.
 * @param readBody what to ask; read when the hands have rested
 * @param typed how often something was typed: another number is another text
 */
export function usePreview(readBody: () => PreviewBody, typed: number, initial: ReadText | null): LivePreview {
  const api = useApi();
  const [answered, setAnswered] = useState<Answered>({
    read: initial,
    problem: null,
    of: initial === null ? null : typed,
  });
  const ask = useEffectEvent(async () => {
    const body = readBody();
    return { markdown: body.markdown, answer: await api.preview(body) };
  });

  useEffect(() => {
    let superseded = false;
    let timer = setTimeout(look, restMilliseconds);
    function look(): void {
      void ask().then(({ markdown, answer }) => {
        if (superseded) return;
        if (answer.ok) {
          setAnswered({ read: { markdown, view: answer.value }, problem: null, of: typed });
          return;
        }
        setAnswered(({ read }) => ({ read, problem: answer.refusal, of: typed }));
        const { status, retryAfterSeconds = patienceSeconds } = answer.refusal;
        // Out of time, or busy: that passes, and nobody has to type for it.
        if (status === 429 || status === 503) timer = setTimeout(look, retryAfterSeconds * 1000);
      });
    }
    return () => {
      superseded = true;
      clearTimeout(timer);
    };
  }, [typed]);

  const { read, problem, of } = answered;
  return { read, problem: of === typed ? problem : null, current: of === typed && problem === null };
}
