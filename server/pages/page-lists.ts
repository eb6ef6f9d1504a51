import type { HomeView, PageView, ShelfView, SubjectSummary, SubjectView } from '../../shared/contracts/views.ts';
import { createRecent, type Recent } from '../../shared/lib/recent.ts';
import { shelves, type Shelf, type SubjectAddress } from '../../shared/pages/address.ts';
import type { PageReader, SubjectRow } from './page-store.ts';
import {
  byKind,
  choicesView,
  factsView,
  pageSummary,
  subjectFacts,
  subjectSummaries,
  subjectView,
} from './page-views.ts';

/** Rows of "issued lately" on the home page. */
const latelyShown = 8;
const subjectsKept = 200;

/** What a page shows of the subject that it stands in. */
export type Surroundings = Pick<PageView, 'facts' | 'choices' | 'siblings'>;

/** Lists of pages and subjects: made when they are first asked for after a publication, and kept until the next. */
export interface PageLists {
  home(): HomeView;
  shelf(shelf: Shelf): ShelfView;
  /** Null where there is no such subject, or all its pages are retired. */
  subject(address: SubjectAddress): SubjectView | null;
  surroundings(subject: SubjectRow): Surroundings;
}

function keep<Key, Value>(kept: Recent<Key, Value>, key: Key, make: () => Value): Value {
  const known = kept.get(key);
  if (known !== undefined) return known;
  const made = make();
  kept.set(key, made);
  return made;
}

/** Makes the book's lists. Whatever changes what they show must raise a subject's version, since they are kept by it. */
export function createPageLists(reader: PageReader): PageLists {
  const homes = createRecent<number, HomeView>(1);
  const summaries = createRecent<string, SubjectSummary[]>(shelves.length);
  const subjects = createRecent<string, SubjectView | null>(subjectsKept);
  const surroundings = createRecent<string, Surroundings>(subjectsKept);

  function subjectsOf(shelf: Shelf): SubjectSummary[] {
    return keep(summaries, `${shelf} ${String(reader.bookVersion())}`, () =>
      subjectSummaries(reader.pagesOfShelf(shelf)),
    );
  }

  return {
    home() {
      return keep(homes, reader.bookVersion(), () => {
        const counts = reader.shelfCounts();
        return {
          shelves: shelves.map((shelf) => {
            const count = counts.find((row) => row.shelf === shelf);
            return { shelf, subjects: count?.subjects ?? 0, lines: count?.lines ?? 0 };
          }),
          donors: subjectsOf('donors'),
          lately: reader.lately(latelyShown).map(pageSummary),
        };
      });
    },
    shelf: (shelf) => ({ shelf, subjects: subjectsOf(shelf) }),
    subject(address) {
      const row = reader.subject(address.shelf, address.subject);
      if (row === null) return null;
      return keep(subjects, `${row.id} ${String(row.version)}`, () => {
        const rows = reader.pagesOfSubject(row.shelf, row.slug);
        return rows[0] === undefined ? null : subjectView(rows[0], rows);
      });
    },
    surroundings(subject) {
      return keep(surroundings, `${subject.id} ${String(subject.version)}`, () => {
        const rows = reader.pagesOfSubject(subject.shelf, subject.slug);
        return {
          facts: factsView(subjectFacts(rows)),
          choices: choicesView(rows.flatMap(({ digest }) => digest.applicabilities)),
          siblings: rows.toSorted(byKind).map(({ page, title, kind }) => ({ page, title, kind })),
        };
      });
    },
  };
}
