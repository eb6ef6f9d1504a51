import type { ReactElement, ReactNode } from 'react';
import { classNames } from './class-names.ts';

interface NoticeProps {
  /** `stop` has a solid edge, `warn` a dashed one, `hint` a dotted one, `good` a double one: told apart without colour. */
  readonly look: 'stop' | 'warn' | 'hint' | 'good';
  readonly title: ReactNode;
  readonly children?: ReactNode;
  /** Read out at once where it appears in answer to something done. */
  readonly live?: boolean;
}

/** A plate that tells what happened, what was kept and what to do. */
export function Notice({ look, title, children, live = false }: NoticeProps): ReactElement {
  return (
    <div className={classNames('notice', `notice-${look}`)} role={live ? 'alert' : undefined}>
      <p className="notice-title">{title}</p>
      {children}
    </div>
  );
}

/** What a refusal says: the shape of an RFC 9457 problem, as far as people read it. */
interface Refusal {
  readonly title: string;
  readonly detail: string;
  readonly fields?: Readonly<Record<string, string>>;
}

/**
 * A refusal in answer to a form, read out at once; what is wrong with each field stands at the field. How long to wait,
 * where one has to, the book's own sentence says.
 */
export function ProblemNotice({ problem, children }: { readonly problem: Refusal; readonly children?: ReactNode }) {
  return (
    <Notice look="stop" title={problem.title} live>
      <p>{problem.detail}</p>
      {children}
    </Notice>
  );
}
