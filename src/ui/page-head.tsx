import type { ReactElement } from 'react';

interface PageHeadProps {
  readonly title: string;
  readonly description?: string | null;
  /** The path that counts as the page's own, without what only chooses how it is shown. */
  readonly canonical?: string;
  /** False for what no search engine should list. */
  readonly listed?: boolean;
}

/** The page's title and its description for other programs. React moves them into the document's head. */
export function PageHead({ title, description, canonical, listed = true }: PageHeadProps): ReactElement {
  return (
    <>
      <title>{title}</title>
      {description === undefined || description === null || description === '' ? null : (
        <meta name="description" content={description} />
      )}
      {canonical === undefined ? null : <link rel="canonical" href={canonical} />}
      {listed ? null : <meta name="robots" content="noindex" />}
    </>
  );
}
