import { describe, expect, it } from 'vitest';
import { lookForLimits } from '../../shared/dialect/look-for-limits.ts';
import { readPage } from '../../shared/dialect/read-page.ts';
import { slowInputs } from '../fixtures/slow-inputs.ts';

describe('Texts that would keep the parser busy for seconds', () => {
  it.each(slowInputs)('are refused before they are parsed: $name', ({ text, limit }) => {
    const refusal = lookForLimits(text);
    expect(refusal?.limit).toBe(limit);
    expect(readPage(text)).toEqual({ ok: false, refusal });
  });

  it.each(slowInputs.filter(({ limit }) => limit !== 'length'))('are told where: $name', ({ text }) => {
    const refusal = lookForLimits(text);
    expect(refusal?.line).toBeGreaterThan(0);
    expect(refusal?.line).toBeLessThanOrEqual(text.split('\n').length);
    expect(refusal?.message).toContain(`Line ${refusal?.line}: `);
  });
});
