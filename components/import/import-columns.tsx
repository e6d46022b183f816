'use client';

import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';
import { saveTextFile } from '@/components/ui/save-text-file';
import { importExample } from '@/lib/schemas/import-examples';
import type { ImportKind } from '@/lib/schemas/vocabulary';
import { importTexts } from '@/lib/texts/import-texts';

type ImportColumnsProps = { kind: ImportKind; labels: readonly string[]; exampleDays: readonly [string, string] };

const whenTexts = { needed: importTexts.needed, one: importTexts.oneOfTwo, optional: importTexts.notNeeded };

/** The columns of one kind of file, and an example to begin from. */
export function ImportColumns({ kind, labels, exampleDays }: ImportColumnsProps) {
  return (
    <div className="flex flex-col items-start gap-2">
      <Disclosure label={importTexts.columnsTitle} openAtFirst>
        <table className="w-full max-w-reading border-collapse text-15">
          <thead>
            <tr className="border-b border-ink text-left text-13">
              <th scope="col" className="py-2 pr-4">{importTexts.column}</th>
              <th scope="col" className="py-2 pr-4">{importTexts.columnHolds}</th>
              <th scope="col" className="py-2">{importTexts.columnWhen}</th>
            </tr>
          </thead>
          <tbody>
            {importTexts.columns[kind].map((column) => (
              <tr key={column.name} className="border-b border-rule align-baseline">
                <th scope="row" className="py-2 pr-4 text-left font-mono font-bold">{column.name}</th>
                <td className="py-2 pr-4">{column.holds}</td>
                <td className="py-2">{whenTexts[column.when]}</td>
              </tr>
            ))}
          </tbody>
        </table>
        <p className="max-w-reading pt-2">{importTexts.formatNotes} {importTexts.visitedByYou}</p>
      </Disclosure>
      <Button look="secondary" onClick={() => saveTextFile(`example-${kind}.csv`, importExample(kind, labels, exampleDays))}>
        {importTexts.example}
      </Button>
    </div>
  );
}
