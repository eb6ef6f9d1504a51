import type { ReactElement } from 'react';
import { useLoaderData } from 'react-router';
import type { PageView } from '../../../shared/contracts/views.ts';
import { pagePath } from '../../../shared/pages/address.ts';
import { pageKindLabels } from '../../../shared/pages/page-kind.ts';
import { Noticed } from '../../blocks/noticed.tsx';
import { Overrides } from '../../blocks/overrides.tsx';
import { RenderedPage } from '../../blocks/rendered-page.tsx';
import { sectionsOf } from '../../blocks/sections.ts';
import { Siblings } from '../../blocks/siblings.tsx';
import { TitleBlock } from '../../blocks/title-block.tsx';
import { TitleLine } from '../../blocks/title-line.tsx';
import { VariantChooser } from '../../blocks/variant-chooser.tsx';
import { pageQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { PageHead } from '../../ui/page-head.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import type { pageLoader } from './page-loaders.ts';

/** A published page: its title line, its text and drawings, its title block. */
export function PageSheet(): ReactElement {
  const { address, variant } = useLoaderData<typeof pageLoader>();
  const view = useAnswer(pageQuery(useApi(), address, variant));
  return (
    <Sheet
      title={view.title}
      line={<TitleLine address={address} view={view} />}
      lead={view.summary}
      beside={<VariantChooser subject={address} variant={variant} choices={view.choices} path={pagePath(address)} />}
      sections={sectionsOf(view.outline)}
      foot={<TitleBlock address={address} view={view} />}
    >
      <PageHead
        title={pageTitle(view)}
        description={view.summary}
        canonical={pagePath(address)}
        listed={!view.retired}
      />
      <Overrides overrides={view.overrides} />
      <RenderedPage of={view.address} html={view.html} />
      <Noticed findings={view.findings} />
      <Siblings address={address} siblings={view.siblings} subjectTitle={view.subjectTitle} variant={variant} />
    </Sheet>
  );
}

/** `Front of the loom · Pinouts · QF550 · Earthstrap`. */
export function pageTitle(view: PageView): string {
  return [view.title, pageKindLabels[view.kind], view.subjectTitle, 'Earthstrap'].join(' · ');
}
