import { useEffect, useRef, type ReactElement, type ReactNode } from 'react';
import { Link, useLoaderData } from 'react-router';
import type { HomeView } from '../../../shared/contracts/views.ts';
import { BenchForm } from '../../blocks/bench-form.tsx';
import { PageLedger } from '../../blocks/page-ledger.tsx';
import { counted, shelfLabels } from '../../blocks/words.ts';
import { variantWords, type Bench } from '../../lib/bench.ts';
import { paths } from '../../lib/paths.ts';
import { homeQuery } from '../../lib/queries.ts';
import { useAnswer, useApi } from '../../lib/use-api.ts';
import { ButtonLink } from '../../ui/button.tsx';
import { PageHead } from '../../ui/page-head.tsx';
import { EmptyPlace, PlainSection, Sheet } from '../../ui/sheet.tsx';
import type { homeLoader } from './home-loader.ts';

/** The first sheet: one question, the bike on the bench, and what was issued lately. */
export function HomeSheet({ searchField }: { readonly searchField: ReactNode }): ReactElement {
  const { bench } = useLoaderData<typeof homeLoader>();
  const view = useAnswer(homeQuery(useApi()));
  return (
    <Sheet title="What is on your bench?">
      <PageHead
        title="Earthstrap: what every connector, wire and component of a donor bike is"
        description="A build club’s shared book of donor motorcycles: connectors, wires, known faults, and what may safely be changed."
        canonical={paths.home}
      />
      <Question searchField={searchField} />
      <MyBike bench={bench} view={view} />
      <PlainSection id="lately" title="Issued lately">
        {view.lately.length === 0 ? (
          <EmptyPlace>
            <p>
              Nothing has been issued yet. The first page of a bike is its overview: what it is, and how its electrics
              are laid out.
            </p>
            <ButtonLink look="primary" to={paths.newSubject('donors')}>
              Write the first donor
            </ButtonLink>
          </EmptyPlace>
        ) : (
          <PageLedger pages={view.lately} caption="Pages issued lately, newest first" withSubject />
        )}
      </PlainSection>
      <PlainSection id="shelves" title="The shelves">
        <ul className="shelf-list">
          {view.shelves.map(({ shelf, subjects, lines }) => (
            <li key={shelf}>
              <Link to={paths.shelf(shelf)}>{shelfLabels[shelf]}</Link>{' '}
              <span className="soft">
                {counted(subjects, shelfNouns[shelf])}
                {lines === 0 ? '' : `, ${counted(lines, 'line')}`}
              </span>
            </li>
          ))}
        </ul>
      </PlainSection>
    </Sheet>
  );
}

const shelfNouns = { donors: 'donor', parts: 'part', reference: 'topic' } as const;

/** Four questions that show what may be asked: a colour and a place, a cavity, a circuit, the text. */
const examples = ['yellow red headlight', 'headlight cavity 3', 'starter relay earth', 'how to measure a pickup'];

function Question({ searchField }: { readonly searchField: ReactNode }): ReactElement {
  const place = useRef<HTMLDivElement>(null);
  useEffect(() => {
    // Not under a thumb: there the keyboard would cover the sheet before it was read.
    if (!window.matchMedia('(hover: hover)').matches || window.location.hash !== '') return;
    place.current?.querySelector('input')?.focus({ preventScroll: true });
  }, []);
  return (
    <div className="home-question" ref={place}>
      {searchField}
      <p className="soft">Ask by a colour, a cavity, a circuit or a bike, as you would say it:</p>
      <ul className="home-examples">
        {examples.map((example) => (
          <li key={example}>
            <Link to={paths.search(example)}>{example}</Link>
          </li>
        ))}
      </ul>
    </div>
  );
}

function MyBike({ bench, view }: { readonly bench: Bench; readonly view: HomeView }): ReactElement | null {
  const donor = view.donors.find(({ slug }) => slug === bench.donor);
  if (view.donors.length === 0) return null;
  if (donor === undefined) {
    return (
      <PlainSection id="my-bike" title="My bike">
        <p>Put your donor on the bench, and its lines come first wherever you look.</p>
        <BenchForm donors={view.donors} next={paths.home} />
      </PlainSection>
    );
  }
  const words = variantWords(bench.variant);
  return (
    <PlainSection id="my-bike" title="My bike">
      <div className="plate home-bike">
        <p>
          <Link className="ledger-name" to={paths.subject({ shelf: 'donors', subject: donor.slug })}>
            {donor.title}
          </Link>
          {words === null ? '' : `, ${words}`}
        </p>
        <p>
          {counted(donor.pages, 'page')}, {counted(donor.connectors, 'connector')}, {counted(donor.lines, 'line')}
        </p>
        <p className="button-row">
          <ButtonLink look="primary" to={paths.subject({ shelf: 'donors', subject: donor.slug })}>
            Open its pages
          </ButtonLink>
          <ButtonLink to={paths.bench}>Change the bench</ButtonLink>
        </p>
      </div>
    </PlainSection>
  );
}
