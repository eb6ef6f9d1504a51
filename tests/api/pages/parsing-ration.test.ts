import { describe, expect, it } from 'vitest';
import { createParsingRation, networkOf } from '../../../server/pages/parsing-ration.ts';

describe('the ration of parsing time', () => {
  it('lets an asker use twenty seconds in any minute, and says how long to wait', () => {
    let milliseconds = 0;
    const ration = createParsingRation(() => milliseconds);
    for (let second = 0; second < 10; second += 1) {
      milliseconds = second * 1000;
      expect(ration.secondsToWait('asker')).toBe(0);
      ration.charge('asker', 2000);
    }
    // The first two seconds of reading were charged at the start of the minute, and fall out of it at its end.
    expect(ration.secondsToWait('asker')).toBe(51);
    milliseconds = 60_001;
    expect(ration.secondsToWait('asker')).toBe(0);
  });

  it('counts each asker alone', () => {
    const ration = createParsingRation(() => 0);
    ration.charge('greedy', 20_000);
    expect(ration.secondsToWait('greedy')).toBe(60);
    expect(ration.secondsToWait('honest')).toBe(0);
  });

  it('counts an IPv6 visitor by their network, and an IPv4 visitor by their address', () => {
    expect(networkOf('192.0.2.7')).toBe('192.0.2.7');
    expect(networkOf('::ffff:192.0.2.7')).toBe('192.0.2.7');
    expect(networkOf('2001:db8:1:2:3:4:5:6')).toBe('2001:db8:1:2::/64');
    expect(networkOf('2001:0DB8:1:2::9')).toBe('2001:db8:1:2::/64');
    expect(networkOf('2001:db8::9')).toBe('2001:db8:0:0::/64');
    expect(networkOf('::1')).toBe('0:0:0:0::/64');
  });
});
