import { useEffect, useState, type ReactElement } from 'react';
import { Link } from 'react-router';

interface DecisionStripProps {
  /** The section at the foot that it leads to. */
  readonly to: string;
  readonly word: string;
}

/** Keeps the way to the foot of the sheet under the thumb, until the foot is there. */
export function DecisionStrip({ to, word }: DecisionStripProps): ReactElement {
  const [reached, setReached] = useState(false);
  useEffect(() => {
    const foot = document.getElementById(to);
    if (foot === null || typeof IntersectionObserver === 'undefined') return;
    const observer = new IntersectionObserver(([seen]) => setReached(seen?.isIntersecting === true));
    observer.observe(foot);
    return () => observer.disconnect();
  }, [to]);
  return (
    <nav className="decision-strip unprinted" aria-label="At the foot of this sheet" hidden={reached}>
      <Link className="button button-plain" to={`#${to}`}>
        {word}
      </Link>
    </nav>
  );
}
