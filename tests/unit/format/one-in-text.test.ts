import { describe, expect, it } from 'vitest';
import { oneInText } from '@/lib/format/one-in-text';

describe('a small chance', () => {
  it('is said as one in so many', () => {
    expect(oneInText(0.125)).toBe('1 in 8');
    expect(oneInText(1)).toBe('1 in 1');
    expect(oneInText(24 ** -3)).toBe('1 in 13,824');
  });
  it('is none at zero or above one', () => {
    expect(() => oneInText(0)).toThrow(RangeError);
    expect(() => oneInText(1.1)).toThrow(RangeError);
  });
});
