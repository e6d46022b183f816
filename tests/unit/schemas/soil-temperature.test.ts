import { describe, expect, it } from 'vitest';
import { parseSoilTemperature } from '@/lib/schemas/soil-temperature';

describe('a soil temperature as typed', () => {
  it.each([
    ['52', 'F', 52_000],
    [' 52.5 ', 'F', 52_500],
    ['11,5', 'C', 11_500],
    ['-1.25', 'C', -1_250],
    ['−2', 'C', -2_000],
    ['0', 'F', 0],
    ['150', 'F', 150_000],
    ['-18', 'C', -18_000],
  ] as const)('%s °%s is kept exactly, with what was typed', (text, unit, thousandths) => {
    expect(parseSoilTemperature(text, unit)).toEqual({ ok: true, temperature: { typed: text.trim(), unit, thousandths } });
  });

  it.each([['', 'F'], ['cold', 'F'], ['5 1/4', 'F'], ['52 F', 'F'], ['1e1', 'C'], ['151', 'F'], ['-1', 'F'], ['67', 'C'], ['-19', 'C'], ['52.555', 'F'], ['9'.repeat(30), 'F']] as const)('"%s" °%s is refused with a sentence', (text, unit) => {
    const parsed = parseSoilTemperature(text, unit);
    expect(parsed.ok ? '' : parsed.message).toMatch(/\.$/);
  });
});
