import type { ReactElement } from 'react';
import { Link, useLoaderData } from 'react-router';
import type { SubjectSummary } from '../../../shared/contracts/views.ts';
import type { Shelf } from '../../../shared/pages/address.ts';
import { ZoneThumbnail } from '../../blocks/zone-thumbnail.tsx';
import { counted, shelfLabels } from '../../blocks/words.ts';
import { paths } from '../../lib/paths.ts';
import { shelfQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { MeasureBar } from '../../ui/measure-bar.tsx';
import { PageHead } from '../../ui/page-head.tsx';
import { EmptyPlace, Sheet } from '../../ui/sheet.tsx';
import type { shelfLoader } from './shelf-loader.ts';

const shelfTexts: Readonly<Record<Shelf, { lead: string; empty: string; add: string }>> = {
  donors: {
    lead: 'The motorcycles that members strip and rebuild, each with its connectors, its known faults and what may safely be changed.',
    empty:
      'No donor stands here yet. The first page of one is its overview: maker and model, years, how it charges and how it sparks.',
    add: 'Add a donor',
  },
  parts: {
    lead: 'What is fitted instead of the original: control units, regulators, lamps, switches.',
    empty:
      'No part stands here yet. Begin with the unit on your own bench: its connector, what each terminal wants, and what it replaces.',
    add: 'Add a part',
  },
  reference: {
    lead: 'What holds for every bike: colours, terminal numbers, wire and fuses, how to measure.',
    empty: 'No topic stands here yet. Begin with what you look up most often.',
    add: 'Add a topic',
  },
};

/** One of the three shelves. */
export function ShelfSheet(): ReactElement {
  const { shelf } = useLoaderData<typeof shelfLoader>();
  const { subjects } = useAnswer(shelfQuery(useApi(), shelf));
  const { lead, empty, add } = shelfTexts[shelf];
  return (
    <Sheet title={shelfLabels[shelf]} lead={lead}>
      <PageHead title={`${shelfLabels[shelf]} · Earthstrap`} description={lead} canonical={paths.shelf(shelf)} />
      {subjects.length === 0 ? (
        <EmptyPlace>
          <p>{empty}</p>
          <ButtonLink look="primary" to={paths.newSubject(shelf)}>
            {add}
          </ButtonLink>
        </EmptyPlace>
      ) : (
        <>
          <SubjectLedger shelf={shelf} subjects={subjects} />
          <p className="button-row shelf-add">
            <ButtonLink to={paths.newSubject(shelf)}>{add}</ButtonLink>
          </p>
        </>
      )}
    </Sheet>
  );
}

interface SubjectLedgerProps {
  readonly shelf: Shelf;
  readonly subjects: readonly SubjectSummary[];
}

function SubjectLedger({ shelf, subjects }: SubjectLedgerProps): ReactElement {
  const mostLines = Math.max(1, ...subjects.map(({ lines }) => lines));
  const wired = subjects.some(({ lines }) => lines > 0);
  return (
    <table className="ledger shelf-ledger">
      <caption className="heard">{shelfLabels[shelf]}</caption>
      <thead>
        <tr>
          {wired ? <th scope="col">Connectors by zone</th> : null}
          <th scope="col">{shelf === 'reference' ? 'Topic' : 'What it is'}</th>
          <th scope="col">Years and markets</th>
          <th scope="col">Documented</th>
        </tr>
      </thead>
      <tbody>
        {subjects.map((subject) => (
          <tr key={subject.slug}>
            {wired ? (
              <td className="shelf-zones">
                {subject.connectors === 0 ? null : <ZoneThumbnail zones={subject.zones} />}
              </td>
            ) : null}
            <th scope="row">
              <Link className="ledger-name" to={paths.subject({ shelf, subject: subject.slug })}>
                {subject.title}
              </Link>
              <p className="ledger-summary">{subject.summary}</p>
            </th>
            <td>
              {subject.years ?? ''}
              {subject.markets.length === 0 ? null : (
                <>
                  {' '}
                  <span className="soft">{subject.markets.join(', ')}</span>
                </>
              )}
            </td>
            <td className="shelf-bars">
              <Documented subject={subject} mostLines={mostLines} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Documented({
  subject,
  mostLines,
}: {
  readonly subject: SubjectSummary;
  readonly mostLines: number;
}): ReactElement {
  if (subject.lines === 0) return <span>{counted(subject.pages, 'page')}</span>;
  return (
    <>
      <MeasureBar value={subject.lines} of={mostLines} words={counted(subject.lines, 'line')} />
      <MeasureBar value={subject.cited} of={subject.lines} words={`${String(subject.cited)} cited`} />
      <span className="soft">
        {counted(subject.connectors, 'connector')} on {counted(subject.pages, 'page')}
      </span>
    </>
  );
}
