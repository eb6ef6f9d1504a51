import { join } from 'node:path';
import { openDatabase } from '../../server/db/client.ts';
import { randomId } from '../../server/db/new-id.ts';
import { createPagePublication } from '../../server/pages/page-publication.ts';
import { createPageService } from '../../server/pages/page-service.ts';
import { createDirectParsePool } from '../factories/parse-pool.ts';
import { requireMadeBook } from './made-book.ts';
import type { Pace } from './pace.ts';
import type { BenchRow } from './row.ts';
import { milliseconds, sideBySide } from './side-by-side.ts';

/** The services of a book of so many made pages. */
function openBook(count: number) {
  const database = openDatabase(join(requireMadeBook(count), 'book.sqlite'));
  const publication = createPagePublication(database, randomId);
  const parsePool = createDirectParsePool();
  const pages = createPageService({ database, parsePool, publication, reading: 'open' });
  const publish = database.sqlite.prepare(
    'UPDATE subjects SET version = version + 1 WHERE id = (SELECT min(id) FROM subjects)',
  );
  // Lists are kept until something is published: made anew each time, as after a publication.
  const makeFirstSheet = (): unknown => {
    publish.run();
    return pages.home(null);
  };
  return { database, makeFirstSheet };
}

/** How the sheets that list the whole book grow with it. */
export async function growthRows(pace: Pace): Promise<BenchRow[]> {
  const [large, small] = [openBook(pace.growthPages), openBook(pace.growthPages / 2)];
  try {
    const times = await sideBySide(pace, 'processor', large.makeFirstSheet, small.makeFirstSheet);
    return [
      {
        what: `the first sheet's data made anew after a publication, ${pace.growthPages.toLocaleString('en')} pages`,
        beside: 'the same from half as many pages',
        measured: milliseconds(times.ours),
        yardstick: milliseconds(times.yardstick),
        ratio: times.timeRatio,
        budget: { kind: 'at most', ratio: 2.3 },
      },
    ];
  } finally {
    large.database.close();
    small.database.close();
  }
}
