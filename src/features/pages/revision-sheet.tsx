import type { ReactElement } from 'react';
import { useLoaderData } from 'react-router';
import { RenderedPage } from '../../blocks/rendered-page.tsx';
import { sectionsOf } from '../../blocks/sections.ts';
import { TitleBlock } from '../../blocks/title-block.tsx';
import { TitleLine } from '../../blocks/title-line.tsx';
import { dayOf } from '../../lib/dates.ts';
import { paths } from '../../lib/paths.ts';
import { revisionQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { PageHead } from '../../ui/page-head.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import type { revisionLoader } from './page-loaders.ts';

/** A page as one of its revisions had it; an old one says so before anybody reads on. */
export function RevisionSheet(): ReactElement {
  const { address, number, variant } = useLoaderData<typeof revisionLoader>();
  const view = useAnswer(revisionQuery(useApi(), address, number, variant));
  const old = view.revision !== view.newestRevision;
  return (
    <Sheet
      title={view.title}
      line={<TitleLine address={address} view={view} old={old} />}
      lead={view.summary}
      sections={sectionsOf(view.outline)}
      foot={<TitleBlock address={address} view={view} old={old} />}
    >
      <PageHead
        title={`Revision ${String(number)} of ${view.title} · ${view.subjectTitle} · Earthstrap`}
        canonical={paths.page(address)}
        listed={false}
      />
      {old ? (
        <Notice
          look="warn"
          title={`This is revision ${String(number)} of ${String(view.newestRevision)}: do not wire by it`}
        >
          <p>
            It was issued on {dayOf(view.publishedAt)} and has been replaced since. Something in it was put right, or
            the bike was measured again.
          </p>
          <p className="button-row unprinted">
            <ButtonLink look="primary" to={paths.page(address)}>
              Open the newest
            </ButtonLink>
            <ButtonLink to={paths.compare(address, number, view.newestRevision)}>See what changed since</ButtonLink>
            <ButtonLink to={paths.propose(address, number)}>Go back to this one</ButtonLink>
          </p>
        </Notice>
      ) : (
        <Notice look="good" title={`Revision ${String(number)} is the newest`}>
          <p className="button-row unprinted">
            <ButtonLink to={paths.page(address)}>Open the page itself</ButtonLink>
          </p>
        </Notice>
      )}
      <RenderedPage of={view.address} html={view.html} />
    </Sheet>
  );
}
