import type { ReactNode } from 'react';
import { DataTable } from '@/components/ui/data-table';
import { Disclosure } from '@/components/ui/disclosure';
import type { TableColumn, TableRow } from '@/components/ui/shown-rows';
import { interfaceTexts } from '@/lib/texts/interface-texts';

export type ChartNotes = {
  /** What is drawn, for who cannot see it and as the name of the table. */
  title: string;
  /** How much it rests on: "4 blocks, 12 row samples a setting". */
  sample: string;
  /** What the bars or bands mean: "Bars are 95 % intervals over blocks". */
  uncertainty: string;
};

type ChartFrameProps = ChartNotes & {
  unit: string;
  columns: readonly TableColumn[];
  rows: readonly TableRow[];
  fileName: string;
  children: ReactNode;
};

/** Around every picture: its unit above, what it rests on below, and its numbers one press away. */
export function ChartFrame({
  title,
  sample,
  uncertainty,
  unit,
  columns,
  rows,
  fileName,
  children,
}: ChartFrameProps) {
  const texts = interfaceTexts.charts;
  return (
    <figure className="flex min-w-0 flex-col gap-2">
      <p className="text-13 text-ink-soft">{unit}</p>
      {children}
      <figcaption className="flex flex-col">
        <span className="text-13 text-ink-soft">
          {sample}. {uncertainty}.
        </span>
        <div data-print="leave-out">
          <Disclosure label={texts.numbersBehind}>
            <DataTable
              caption={title}
              columns={columns}
              rows={rows}
              fileName={fileName}
              emptyText={texts.noNumbers}
            />
          </Disclosure>
        </div>
      </figcaption>
    </figure>
  );
}
