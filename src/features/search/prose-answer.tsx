import type { ReactElement } from 'react';
import { Link } from 'react-router';
import type { SearchHit } from '../../../shared/contracts/views.ts';

/** A section or a page, with the words around what was found. */
export function ProseAnswer({ hit }: { readonly hit: SearchHit }): ReactElement {
  return (
    <li className="answer answer-prose">
      <p className="answer-place">
        <span className="answer-subject">{hit.subjectTitle}</span>
      </p>
      <h3 className="answer-title">
        <Link to={hit.path} data-answer="">
          {hit.title}
        </Link>
      </h3>
      {hit.excerpt === null ? null : <p className="answer-excerpt">{hit.excerpt}</p>}
    </li>
  );
}
