import type { ReactElement } from 'react';
import { useLoaderData } from 'react-router';
import type { SubjectView } from '../../../shared/contracts/views.ts';
import type { SubjectAddress } from '../../../shared/pages/address.ts';
import { Noticed } from '../../blocks/noticed.tsx';
import { Overrides } from '../../blocks/overrides.tsx';
import { PageLedger } from '../../blocks/page-ledger.tsx';
import { RenderedPage } from '../../blocks/rendered-page.tsx';
import { sectionsOf } from '../../blocks/sections.ts';
import { TitleBlock } from '../../blocks/title-block.tsx';
import { TitleLine } from '../../blocks/title-line.tsx';
import { VariantChooser } from '../../blocks/variant-chooser.tsx';
import { subjectLabels } from '../../blocks/words.ts';
import { paths } from '../../lib/paths.ts';
import { pageQuery, subjectQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { PageHead } from '../../ui/page-head.tsx';
import { Section, Sheet, type SheetSection } from '../../ui/sheet.tsx';
import { ConnectorsByZone } from './connectors-by-zone.tsx';
import { FactsLine } from './facts-line.tsx';
import type { subjectLoader } from './subject-loader.ts';

/** One donor, part or topic: its facts, its pages, where its connectors are, its overview, and how to help. */
export function SubjectSheet(): ReactElement {
  const { subject, variant } = useLoaderData<typeof subjectLoader>();
  const api = useApi();
  const view = useAnswer(subjectQuery(api, subject));
  const address = { ...subject, page: 'overview' };
  const overview = useAnswer(pageQuery(api, address, variant));
  const pages = view.pages.filter(({ page }) => page !== 'overview');
  const path = paths.subject(subject);
  return (
    <Sheet
      title={overview.title}
      line={<TitleLine address={address} view={overview} />}
      lead={overview.summary}
      beside={<VariantChooser subject={subject} variant={variant} choices={overview.choices} path={path} />}
      sections={sectionsOfSubject(view, overview.outline)}
      foot={<TitleBlock address={address} view={overview} />}
    >
      <PageHead
        title={`${overview.title} · Earthstrap`}
        description={overview.summary}
        canonical={path}
        listed={!overview.retired}
      />
      <FactsLine facts={view.facts} />
      {pages.length === 0 ? null : (
        <Section id={sectionIds.pages} title="Its pages">
          <PageLedger pages={pages} caption={`Pages of the ${overview.title}`} variant={variant} />
        </Section>
      )}
      {view.connectors.length === 0 ? null : (
        <Section id={sectionIds.connectors} title="Connectors, by where they hide">
          <ConnectorsByZone subject={subject} connectors={view.connectors} pages={view.pages} />
        </Section>
      )}
      <Overrides overrides={overview.overrides} />
      <RenderedPage of={overview.address} html={overview.html} />
      <Noticed findings={overview.findings} />
      <Section id={sectionIds.help} title="How to help">
        <HowToHelp subject={subject} view={view} />
      </Section>
    </Sheet>
  );
}

/** Anchors of our own sections; no heading of a text can have them, since those begin with `s-`. */
const sectionIds = { pages: 'its-pages', connectors: 'its-connectors', help: 'how-to-help' } as const;

/** The letters in the order in which the sections stand on the sheet. */
function sectionsOfSubject(view: SubjectView, outline: Parameters<typeof sectionsOf>[0]): SheetSection[] {
  return [
    ...(view.pages.some(({ page }) => page !== 'overview') ? [{ id: sectionIds.pages, text: 'Its pages' }] : []),
    ...(view.connectors.length === 0 ? [] : [{ id: sectionIds.connectors, text: 'Connectors, by where they hide' }]),
    ...sectionsOf(outline),
    { id: sectionIds.help, text: 'How to help' },
  ];
}

function HowToHelp({ subject, view }: { readonly subject: SubjectAddress; readonly view: SubjectView }): ReactElement {
  const { lines, cited } = view.summary;
  return (
    <>
      <p className="measured">
        {lines === 0
          ? 'No line of it is written down yet: no connector, no wire, no component. The connector in front of you is a good first one.'
          : lines === cited
            ? 'Every line names a manual or a standard. What it lacks is a second pair of eyes: compare one connector with your own bike.'
            : `${String(lines - cited)} of its ${String(lines)} lines name no factory manual or standard. If you have the book at hand, look one up and propose its page number.`}
      </p>
      <p className="button-row">
        <ButtonLink to={paths.newPage(subject)}>Write another page</ButtonLink>
        <ButtonLink to={paths.propose({ ...subject, page: 'overview' })}>
          Put this {subjectLabels[subject.shelf].toLowerCase()}’s overview right
        </ButtonLink>
      </p>
    </>
  );
}
