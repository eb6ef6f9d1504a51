import { describe, expect, it } from 'vitest';
import { terminalNumbers } from '../../shared/electrics/terminal-numbers.ts';

/*
 * DIN 72552-2 by way of pages that copy it: an encyclopedia's table of the standard (1, 4, 49, 50), a handbook maker's
 * table (15, 15a, 30, 31, 31b), trade pages on vehicle electrics (53–58, 61, B+, D+, DF, L, R) and a page on relays
 * (85–87a). 57, 87b and the tail lamps under 58 are recalled only, and are not tested but for saying so.
 */
const read = [
  ['1', /coil.*low voltage/],
  ['4', /coil.*high voltage/],
  ['15', /switched positive/],
  ['15a', /series resistor/],
  ['30', /battery positive, direct/],
  ['31', /battery negative/],
  ['31b', /switch or relay/],
  ['49', /flasher.*input/],
  ['49a', /flasher.*output/],
  ['50', /starter/],
  ['53', /wiper/],
  ['54', /brake lamps/],
  ['55', /fog lamps/],
  ['56', /headlamp/],
  ['56a', /main beam/],
  ['56b', /dipped beam/],
  ['57a', /parking/],
  ['58', /number-plate/],
  ['61', /charge/],
  ['85', /winding.*negative/],
  ['86', /winding.*positive/],
  ['87', /make contact/],
  ['87a', /break contact/],
  ['B+', /battery positive at the generator/],
  ['D+', /dynamo positive/],
  ['DF', /field/],
  ['L', /left/],
  ['R', /right/],
] as const;

describe('terminal numbers of DIN 72552', () => {
  it.each(read)('%s is %s', (terminal, meaning) => {
    const row = terminalNumbers.find((candidate) => candidate.terminal === terminal);
    expect(row?.provenance).toBe('read');
    expect(row?.meaning).toMatch(meaning);
  });

  it('says of two that they are recalled, and lists nothing else', () => {
    const recalled = terminalNumbers.filter(({ provenance }) => provenance === 'memory');
    expect(recalled.map(({ terminal }) => terminal)).toEqual(['57', '87b']);
    expect(terminalNumbers).toHaveLength(read.length + 2);
  });
});
