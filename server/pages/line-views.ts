import { createHash } from 'node:crypto';
import { isCited } from '../../shared/blocks/cited.ts';
import { claimOf } from '../../shared/blocks/claim.ts';
import { tableBlocks } from '../../shared/blocks/lines.ts';
import type { PageData } from '../../shared/contracts/views.ts';
import type { PageText } from '../../shared/dialect/page-text.ts';
import { formatPageAddress, type PageAddress } from '../../shared/pages/address.ts';

/** Hexadecimal digits of a claim's hash: 64 bits, for some hundred thousand lines of one club. */
const claimDigits = 16;

/** Every line of a page with its full address, the hash of what it claims, and its mark. */
export function lineViews(address: PageAddress, { blocks, frontMatter }: PageText): PageData['lines'] {
  const page = formatPageAddress(address);
  return tableBlocks(blocks).flatMap((block) =>
    block.lines.map((line) => ({
      address: `${page}#${line.address}`,
      claim: createHash('sha256').update(claimOf(block, line)).digest('hex').slice(0, claimDigits),
      mark: isCited(line.cite, frontMatter.sources) ? ('cited' as const) : ('unchecked' as const),
    })),
  );
}
