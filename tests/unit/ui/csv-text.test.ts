import { describe, expect, it } from 'vitest';
import { csvText } from '@/components/ui/csv-text';

describe('the text of a table as CSV', () => {
  it('quotes what holds a comma, a quote or a line end', () => {
    expect(csvText(['a', 'b'], [['31,300', 'so "late"']])).toBe('a,b\r\n"31,300","so ""late"""\r\n');
  });

  it.each(['=1+1', '+cmd', '-2+3', '@sum(a1)', '\t=1', '\r=1'])(
    'keeps a spreadsheet from running %j as a formula',
    (cell) => {
      expect(csvText(['a'], [[cell]])).toMatch(/^a\r\n"?'/);
    },
  );

  it.each(['-3.2', '+1.5', '-1,200', '\u22123.2', '88 %'])('leaves the number %s as it is shown', (cell) => {
    expect(csvText(['a'], [[cell]])).not.toContain("'");
  });
});
