import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { appliesToAll, type Applicability } from '../pages/applicability.ts';
import {
  cavityAddress,
  checkAddress,
  componentAddress,
  insideAddress,
  positionAddress,
  wireAddress,
  wireEnds,
} from './line-address.ts';
import { formatTerminalName, readTerminalName } from './terminal-name.ts';
import type { TerminalName } from './block.ts';

const from1980: Applicability = { years: [{ from: 1980, to: null }], markets: [], frames: [] };
const inTheUk: Applicability = { years: [], markets: ['UK'], frames: [] };

function terminal(written: string): TerminalName {
  return readTerminalName(written) ?? { id: '', terminal: null };
}

describe('addresses of lines', () => {
  it('say the connector, the cavity and which wire in it', () => {
    expect(cavityAddress('headlight', '3', 0, appliesToAll)).toBe('headlight.3');
    expect(cavityAddress('headlight', '2', 1, appliesToAll)).toBe('headlight.2+');
    expect(cavityAddress('headlight', 'B+', 2, appliesToAll)).toBe('headlight.B+++');
  });

  it('end with what a row holds for, and only with that', () => {
    expect(cavityAddress('headlight', '2', 0, from1980)).toBe('headlight.2~1980-');
    expect(cavityAddress('headlight', '2', 0, inTheUk)).toBe('headlight.2~~UK');
    expect(componentAddress('main-fuse', { ...from1980, frames: ['F1', 'F2'] })).toBe('main-fuse~1980-~~F1,F2');
  });

  it('have positions and checks as slugs, or as written where no slug can be made of them', () => {
    expect(positionAddress('ignition', 'On', appliesToAll)).toBe('ignition@on');
    expect(positionAddress('lights', 'Hi / Lo', appliesToAll)).toBe('lights@hi-lo');
    expect(positionAddress('lights', '⇦', appliesToAll)).toBe('lights@⇦');
    expect(checkAddress('Pickup coil', appliesToAll)).toBe('check@pickup-coil');
  });

  it('order the ends of a wire by code point, whichever end was written first', () => {
    const ends = [terminal('ignition.R'), terminal('main-fuse.out')] as const;
    expect(wireAddress(ends[0], ends[1], appliesToAll)).toBe('ignition.R--main-fuse.out');
    expect(wireAddress(ends[1], ends[0], appliesToAll)).toBe('ignition.R--main-fuse.out');
    expect(wireAddress(terminal('frame'), terminal('battery.-'), from1980)).toBe('battery.---frame~1980-');
    expect(wireAddress(terminal('a.r'), terminal('a.R'), appliesToAll)).toBe('a.R--a.r');
  });

  it('keep the order of a row inside a unit, and leave out a To that is empty', () => {
    expect(insideAddress('flash-unit', '49a', '49', appliesToAll)).toBe('flash-unit@49a--49');
    expect(insideAddress('unit', 'KILL', null, appliesToAll)).toBe('unit@KILL');
  });

  it('hold no white space', () => {
    expect(cavityAddress('headlight', 'A 1', 0, { ...inTheUk, markets: ['South Africa'] })).toBe(
      'headlight.A-1~~South-Africa',
    );
  });
});

describe('wireEnds', () => {
  it('divides at the last --, since a terminal may be called -', () => {
    expect(wireEnds('battery.---frame')).toEqual(['battery.-', 'frame']);
    expect(wireEnds('battery.+--battery.-')).toEqual(['battery.+', 'battery.-']);
    expect(wireEnds('ignition.R--main-fuse.out~1980-')).toEqual(['ignition.R', 'main-fuse.out']);
  });

  it('knows the address of another line from that of a wire', () => {
    expect(wireEnds('flash-unit@49--49a')).toBeNull();
    expect(wireEnds('headlight.3')).toBeNull();
  });

  it('finds again both ends of any wire', () => {
    const id = fc.stringMatching(/^[a-z]{1,4}(-[a-z0-9]{1,3})?$/);
    const name = fc.stringMatching(/^[A-Za-z0-9+-]{1,3}$/).filter((text) => !text.includes('--'));
    const end = fc.record({ id, terminal: fc.option(name) });
    fc.assert(
      fc.property(end, end, (a, b) => {
        const found = wireEnds(wireAddress(a, b, from1980));
        expect(new Set(found)).toEqual(new Set([formatTerminalName(a), formatTerminalName(b)]));
      }),
    );
  });
});
