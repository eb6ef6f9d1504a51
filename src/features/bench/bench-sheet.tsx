import type { ReactElement } from 'react';
import { Form, useLoaderData } from 'react-router';
import { BenchForm } from '../../blocks/bench-form.tsx';
import { PageLedger } from '../../blocks/page-ledger.tsx';
import { VariantChooser } from '../../blocks/variant-chooser.tsx';
import { variantWords, type Bench } from '../../lib/bench.ts';
import { paths } from '../../lib/paths.ts';
import { homeQuery, pageQuery, subjectQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { Button, ButtonLink } from '../../ui/button.tsx';
import { PageHead } from '../../ui/page-head.tsx';
import { EmptyPlace, PlainSection, Sheet } from '../../ui/sheet.tsx';
import type { benchLoader } from './bench-loader.ts';

/** What is on the reader's bench, with everything that the book has of it. */
export function BenchSheet(): ReactElement {
  const { bench } = useLoaderData<typeof benchLoader>();
  return bench.donor === null ? <EmptyBench /> : <DonorOnBench donor={bench.donor} bench={bench} />;
}

function EmptyBench(): ReactElement {
  const { donors } = useAnswer(homeQuery(useApi()));
  return (
    <Sheet
      title="The bench is empty"
      lead="Say which donor stands in front of you. It is kept in this browser and nowhere else."
    >
      <PageHead title="My bike · Earthstrap" listed={false} />
      {donors.length === 0 ? (
        <EmptyPlace>
          <p>No donor is in the book yet. The first page of one is its overview.</p>
          <ButtonLink look="primary" to={paths.newSubject('donors')}>
            Write the first donor
          </ButtonLink>
        </EmptyPlace>
      ) : (
        <BenchForm donors={donors} next={paths.bench} />
      )}
    </Sheet>
  );
}

function DonorOnBench({ donor, bench }: { readonly donor: string; readonly bench: Bench }): ReactElement {
  const api = useApi();
  const subject = { shelf: 'donors', subject: donor } as const;
  const { summary, pages } = useAnswer(subjectQuery(api, subject));
  const { choices } = useAnswer(pageQuery(api, { ...subject, page: 'overview' }, bench.variant));
  const { donors } = useAnswer(homeQuery(api));
  const words = variantWords(bench.variant);
  return (
    <Sheet
      title={summary.title}
      lead={
        words === null
          ? 'On the bench; say which one, and what does not hold for it is set back.'
          : `On the bench: ${words}`
      }
      beside={<VariantChooser subject={subject} variant={bench.variant} choices={choices} path={paths.bench} open />}
    >
      <PageHead title={`My bike: ${summary.title} · Earthstrap`} listed={false} />
      <PlainSection id="pages" title="Its pages">
        <PageLedger pages={pages} caption={`Pages of the ${summary.title}`} />
      </PlainSection>
      <PlainSection id="another" title="Another bike">
        <BenchForm donors={donors} chosen={donor} next={paths.bench} />
        <Form method="post" action={paths.bench}>
          <input type="hidden" name="donor" value="" />
          <Button>Clear the bench</Button>
        </Form>
      </PlainSection>
    </Sheet>
  );
}
