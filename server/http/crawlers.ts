import { Router } from 'express';
import { pagePath, shelves } from '../../shared/pages/address.ts';
import type { BookEvents } from '../pages/book-events.ts';
import type { PageService } from '../pages/page-service-types.ts';
import { publicCache, sendRepresentation } from './representation.ts';

interface CrawlerParts {
  readonly pages: PageService;
  readonly events: BookEvents;
  readonly baseUrl: URL;
  readonly reading: 'open' | 'members';
}

/** What search engines ask for: where they may go, and every page that a visitor may read. */
export function createCrawlerRouter({ pages, events, baseUrl, reading }: CrawlerParts): Router {
  const router = Router();
  let sitemap: Promise<string> | null = null;
  events.listen(() => {
    sitemap = null;
  });

  router.get('/robots.txt', async (request, response) => {
    await sendRepresentation(request, response, {
      status: 200,
      contentType: 'text/plain; charset=utf-8',
      text: reading === 'open' ? openToRobots(baseUrl) : closedToRobots,
      cacheControl: publicCache,
    });
  });

  router.get('/sitemap.xml', async (request, response) => {
    sitemap ??= makeSitemap(pages, baseUrl);
    await sendRepresentation(request, response, {
      status: 200,
      contentType: 'application/xml; charset=utf-8',
      text: await sitemap,
      cacheControl: publicCache,
    });
  });
  return router;
}

const closedToRobots = 'User-agent: *\nDisallow: /\n';

function openToRobots(baseUrl: URL): string {
  const places = ['/api/', '/account', '/proposals', '/search', '/sign-in'].map((path) => `Disallow: ${path}`);
  return ['User-agent: *', ...places, `Sitemap: ${baseUrl.origin}/sitemap.xml`, ''].join('\n');
}

/** Every page that a visitor may read: none where reading is for members. */
async function makeSitemap(pages: PageService, baseUrl: URL): Promise<string> {
  const addresses: string[] = [];
  for (const shelf of shelves) {
    const listed = await pages.shelf(null, shelf);
    if (!listed.ok) break;
    addresses.push(`/${shelf}`);
    for (const { slug } of listed.value.subjects) {
      const subject = await pages.subject(null, { shelf, subject: slug });
      if (!subject.ok) continue;
      for (const { page } of subject.value.pages) addresses.push(pagePath({ shelf, subject: slug, page }));
    }
  }
  // Slugs need no escaping in XML, nor does the origin of an address that was parsed.
  const urls = addresses.map((path) => `<url><loc>${baseUrl.origin}${path}</loc></url>`);
  return `<?xml version="1.0" encoding="UTF-8"?>\n<urlset xmlns="http://www.sitemaps.org/schemas/sitemap/0.9">${urls.join('')}</urlset>\n`;
}
