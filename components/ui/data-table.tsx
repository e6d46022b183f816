'use client';

import { useId, useState } from 'react';
import { interfaceTexts } from '@/lib/texts/interface-texts';
import { Button } from './button';
import { csvText } from './csv-text';
import { TableCell } from './table-cell';
import { TextInput } from './text-input';
import { saveTextFile } from './save-text-file';
import { shownRows, type TableColumn, type TableRow, type TableSort } from './shown-rows';

type DataTableProps = {
  /** Names the table for the reader and for the scrolling region. */
  caption: string;
  /** The caption is shown, unless a heading right above already says it. */
  captionShown?: boolean;
  columns: readonly TableColumn[];
  rows: readonly TableRow[];
  filter?: boolean;
  /** Name of the downloaded file, without its ending; no download without it. */
  fileName?: string;
  initialSort?: TableSort;
  /** What stands instead of rows when there are none. */
  emptyText: string;
};

/** A table that sorts, filters, keeps its column heads in view and saves what it shows. */
export function DataTable({
  caption,
  captionShown = false,
  columns,
  rows,
  filter = false,
  fileName,
  initialSort,
  emptyText,
}: DataTableProps) {
  const [sort, setSort] = useState<TableSort | undefined>(initialSort);
  const [words, setWords] = useState('');
  const filterId = useId();
  const texts = interfaceTexts.controls;
  const shown = shownRows(rows, columns, words, sort);

  function download() {
    const body = shown.map((row) => columns.map((column) => row.cells[column.key]?.text ?? ''));
    saveTextFile(
      `${fileName}.csv`,
      csvText(
        columns.map((column) => column.head),
        body,
      ),
    );
  }

  return (
    <div className="flex min-w-0 flex-col gap-2">
      {filter || fileName ? (
        <div className="flex flex-wrap items-end justify-between gap-3" data-print="leave-out">
          {filter ? (
            <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
              <label htmlFor={filterId} className="text-15">
                {texts.filter}
              </label>
              <div className="w-56">
                <TextInput
                  id={filterId}
                  type="search"
                  value={words}
                  onChange={(event) => setWords(event.target.value)}
                />
              </div>
              <p role="status" className="text-13 text-ink-soft">
                {words ? texts.rowsShown(shown.length, rows.length) : ''}
              </p>
            </div>
          ) : (
            <span />
          )}
          {fileName && rows.length > 0 ? (
            <Button look="quiet" onClick={download}>
              {texts.downloadCsv}
            </Button>
          ) : null}
        </div>
      ) : null}
      <div
        role="region"
        aria-label={`${caption}, ${texts.scrollsSideways}`}
        tabIndex={0}
        className="max-h-[85vh] overflow-auto print:max-h-none print:overflow-visible"
      >
        <table className="w-full border-collapse text-15">
          <caption className={captionShown ? 'pb-2 text-left text-15 font-bold' : 'sr-only'}>
            {caption}
          </caption>
          <thead>
            <tr>
              {columns.map((column, index) => {
                const sorted = sort?.key === column.key ? sort.direction : undefined;
                const side = column.align === 'number' ? 'text-right' : 'text-left';
                return (
                  <th
                    key={column.key}
                    scope="col"
                    aria-sort={sorted}
                    className={`sticky top-0 border-b border-ink bg-paper align-bottom text-13 font-bold ${side} ${index === 0 ? 'left-0 z-20 pr-4' : 'z-10 pl-4'}`}
                  >
                    {column.sortable === false ? (
                      <span className="inline-block py-2">{column.head}</span>
                    ) : (
                      <button
                        type="button"
                        onClick={() =>
                          setSort({
                            key: column.key,
                            direction: sorted === 'ascending' ? 'descending' : 'ascending',
                          })
                        }
                        className={`min-h-press w-full cursor-pointer py-2 align-bottom font-bold ${side}`}
                      >
                        <span
                          className={`relative inline-block underline-offset-4 hover:underline ${sorted ? 'underline decoration-2' : ''}`}
                        >
                          {column.head}
                          {/* Beside the words, on the side away from the numbers, so that heads and numbers stay in line. */}
                          <span
                            aria-hidden="true"
                            className={`absolute ${column.align === 'number' ? 'right-full' : 'left-full'}`}
                          >
                            {sorted === 'ascending' ? '↑' : sorted === 'descending' ? '↓' : ''}
                          </span>
                        </span>
                      </button>
                    )}
                  </th>
                );
              })}
            </tr>
          </thead>
          <tbody>
            {shown.map((row) => (
              <tr key={row.id} className={`border-b border-rule ${row.highlighted ? 'bg-bone' : 'bg-paper'}`}>
                {columns.map((column, index) => (
                  <TableCell
                    key={column.key}
                    cell={row.cells[column.key]}
                    align={column.align ?? 'text'}
                    heads={index === 0}
                  />
                ))}
              </tr>
            ))}
            {shown.length === 0 ? (
              <tr>
                <td colSpan={columns.length} className="py-4 text-left">
                  {rows.length === 0 ? emptyText : texts.noRowMatches}
                </td>
              </tr>
            ) : null}
          </tbody>
        </table>
      </div>
    </div>
  );
}
