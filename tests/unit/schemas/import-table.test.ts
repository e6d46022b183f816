import { describe, expect, it } from 'vitest';
import { importExample } from '@/lib/schemas/import-examples';
import { readImportCounts } from '@/lib/schemas/import-counts';
import { readImportTapeSheets } from '@/lib/schemas/import-tape-sheets';

const said = (text: string) => readImportCounts(text).problems.map(({ line, column, message }) => `${line ?? 'file'} ${column ?? ''}: ${message}`);

describe('a file of counts', () => {
  it.each([
    ['commas', 'row_sample,date,time,so_far,doubtful,marker\nA-1,2026-05-18,07:30,24,2,white\n'],
    ['semicolons', 'row_sample;date;time;so_far;doubtful;marker\nA-1;2026-05-18;07:30;24;2;white\n'],
    ['tabs', 'row_sample\tdate\ttime\tso_far\tdoubtful\tmarker\nA-1\t2026-05-18\t07:30\t24\t2\twhite\n'],
    ['a byte-order mark, Windows line ends and quotation marks', '\uFEFF"row_sample","date","time","so_far","doubtful","marker"\r\n"A-1","2026-05-18","7:30","24","2","white"\r\n'],
    ['columns in another order and spaces around the cells', 'marker, so_far, doubtful, date, row_sample, time\nwhite , 24, 2, 2026-05-18, A-1, 07:30:00\n'],
  ])('is read with %s', (_, text) => {
    expect(readImportCounts(text)).toEqual({
      problems: [],
      lines: [{ line: 2, rowSample: 'A-1', date: '2026-05-18', time: '07:30', countedAs: 'so-far', plants: 24, doubtful: 2, marker: 'white' }],
    });
  });

  it('may leave out what may be left out, and says new instead of so far', () => {
    expect(readImportCounts('row_sample,date,new\nA-1,2026-05-18,3\n').lines).toEqual([
      { line: 2, rowSample: 'A-1', date: '2026-05-18', time: null, countedAs: 'new', plants: 3, doubtful: 0, marker: null },
    ]);
  });

  it('numbers its lines as an editor does, empty ones counted', () => {
    expect(said('row_sample,date,so_far\n\nA-1,2026-05-18,4\n\n,,\nA-2,2026-05-18,many\n')).toEqual(['6 so_far: "many" is no whole number. Write the plants, such as 24.']);
  });

  it.each([
    ['row,date,so_far\nA-1,2026-05-18,4', /It has "row", which no column is called\. It lacks row_sample\./],
    ['Row_Sample,Date,So_Far\nA-1,2026-05-18,4', /It has "Row_Sample", "Date", "So_Far"/],
    ['row_sample,date\nA-1,2026-05-18', /It must have so_far or new, one of the two\./],
    ['row_sample,date,so_far,new\nA-1,2026-05-18,4,4', /It must have so_far or new, one of the two\./],
    ['row_sample,date,so_far,date\nA-1,2026-05-18,4,2026-05-18', /It names date twice\./],
    ['row_sample,date;so_far\nA-1,2026-05-18;4', /more than one kind of separator/],
    ['A-1,2026-05-18,4', /It lacks row_sample, date\./],
    ['row_sample,date,so_far\n', /There is no line below the column names\./],
    ['', /The file is empty\./],
    ['\uFEFF \n', /The file is empty\./],
    ['PK\u0003\u0004\0\0', /no plain text file/],
    ['row_sample,date,so_far\nA-1,2026-05-18,4,5', /This line has 4 cells where the first line names 3\. Check the commas/],
    ['row_sample,date,so_far\n"A-1,2026-05-18,4', /A quotation mark opens a cell here/],
  ])('says what is wrong with %j', (text, message) => {
    expect(said(text).join('\n')).toMatch(message);
  });

  it('names every bad cell of a line', () => {
    expect(said('row_sample,date,time,so_far,doubtful,marker\n,5/6/2026,25:00,2.5,-1,a marker of more than twenty letters')).toEqual([
      '2 row_sample: Write the label of the row sample.',
      '2 date: "5/6/2026" is no date as year-month-day. Write it such as 2026-05-18.',
      '2 time: "25:00" is no time of day. Write it such as 07:30, or leave it empty.',
      '2 so_far: "2.5" is no whole number. Write the plants, such as 24.',
      '2 doubtful: "-1" is no whole number. Write the doubtful plants, such as 24.',
      '2 marker: Use at most 20 characters.',
    ]);
  });

  it.each(['2026-02-30', '2026-13-01', '18 May', '20260518', '2026-5-18', '0'])('does not take %s for a date', (date) => {
    expect(said(`row_sample,date,so_far\nA-1,${date},4`)).toHaveLength(1);
  });

  it('refuses the same row sample, date and time twice, whatever case the label is in', () => {
    expect(said('row_sample,date,so_far\nA-1,2026-05-18,4\na-1,2026-05-18,5')).toEqual([
      '3 row_sample: Line 2 has this row sample, date and time already. Leave one of the two out, or give each its time.',
    ]);
  });

  it('takes 2,000 lines and not 2,001', () => {
    const lines = (count: number) => `row_sample,date,so_far\n${Array.from({ length: count }, (_, index) => `R-${index},2026-05-18,4`).join('\n')}\n`;
    expect(readImportCounts(lines(2_000))).toMatchObject({ problems: [], lines: { length: 2_000 } });
    expect(said(lines(2_001))).toEqual(['file : The file has 2,001 lines; at most 2,000 are taken at once. Split it.']);
  });

  it('leaves formula-like text as text', () => {
    expect(readImportCounts('row_sample,date,so_far,marker\n=1+1,2026-05-18,4,@sum').lines).toMatchObject([{ rowSample: '=1+1', marker: '@sum' }]);
  });
});

describe('a file of tape sheets', () => {
  it('makes one sheet of each row sample and date, places as typed', () => {
    const { sheets, problems } = readImportTapeSheets(
      'row_sample;date;tape;place;marker;kind;leaf_stage\nA-1;2026-05-19;in;3,5;white;;2,5\nA-1;2026-05-19;in;9 1/2;;late;\nA-2;2026-05-19;ft-in;5\'3";;missing;\n',
    );
    expect(problems).toEqual([]);
    expect(sheets).toEqual([
      {
        line: 2, rowSample: 'A-1', date: '2026-05-19', tapeUnit: 'in',
        places: [{ line: 2, typed: '3,5', kind: 'plant', marker: 'white', leafStage: 2.5 }, { line: 3, typed: '9 1/2', kind: 'late', marker: null, leafStage: null }],
      },
      { line: 4, rowSample: 'A-2', date: '2026-05-19', tapeUnit: 'ft-in', places: [{ line: 4, typed: '5\'3"', kind: 'missing', marker: null, leafStage: null }] },
    ]);
  });

  it('names a bad tape, kind, place and leaf stage, and a sheet off two tapes', () => {
    const { problems } = readImportTapeSheets(
      'row_sample,date,tape,place,kind,leaf_stage\nA-1,2026-05-19,yards,3,dead,x\nA-1,2026-05-19,in,sixty,,21\nA-1,2026-05-19,cm,3,,\n',
    );
    expect(problems.map(({ line, column }) => `${line} ${column}`)).toEqual(['2 tape', '2 kind', '2 leaf_stage', '3 leaf_stage', '3 place', '4 tape']);
  });

  it('reads its own examples', () => {
    const days: [string, string] = ['2026-05-17', '2026-05-18'];
    expect(readImportCounts(importExample('counts', ['S1-1'], days))).toMatchObject({ problems: [], lines: { length: 4 } });
    expect(readImportTapeSheets(importExample('tape-sheets', [], days))).toMatchObject({ problems: [], sheets: { length: 1 } });
  });
});
