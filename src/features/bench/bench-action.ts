import { redirect, type ActionFunctionArgs } from 'react-router';
import { isSlug } from '../../../shared/lib/slug.ts';
import { parseVariant } from '../../../shared/pages/variant.ts';
import { benchCookies, emptyBench, variantQuery } from '../../lib/bench.ts';
import { keepCookies } from '../../lib/cookies.ts';
import { readText, readWayBack } from '../../lib/form-fields.ts';
import { paths } from '../../lib/paths.ts';

/** Puts a donor on the bench, or clears it, and goes back to where that was done with the variant in the address. */
export async function benchAction({ request }: ActionFunctionArgs): Promise<Response> {
  const form = await request.formData();
  const next = readWayBack(form, paths.bench);
  const donor = readText(form, 'donor');
  if (!isSlug(donor)) return redirect(next, { headers: keepCookies(benchCookies(emptyBench)) });
  const variant = parseVariant({
    year: readText(form, 'year'),
    market: readText(form, 'market'),
    frame: readText(form, 'frame'),
  });
  return redirect(next === paths.bench ? next : next + variantQuery(variant), {
    headers: keepCookies(benchCookies({ donor, variant })),
  });
}
