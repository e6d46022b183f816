import Link from 'next/link';
import type { TableCellData } from './shown-rows';

type TableCellProps = { cell: TableCellData | undefined; align: 'text' | 'number'; heads: boolean };

/** One cell; the first of a row names the row and stays in view when the rest scrolls sideways. */
export function TableCell({ cell, align, heads }: TableCellProps) {
  const content = cell?.node ?? (cell?.href ? <Link href={cell.href}>{cell.text}</Link> : cell?.text);
  const body = (
    <>
      {content}
      {cell?.detail ? <span className="block text-13 font-normal text-ink-soft">{cell.detail}</span> : null}
    </>
  );
  if (heads)
    return (
      <th
        scope="row"
        className="sticky left-0 max-w-[45vw] min-w-32 bg-inherit py-3 pr-4 text-left align-baseline font-bold"
      >
        {body}
      </th>
    );
  const look = align === 'number' ? 'text-right font-mono whitespace-nowrap' : 'text-left';
  return <td className={`py-3 pl-4 align-baseline ${look}`}>{body}</td>;
}
