import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { importTexts } from '@/lib/texts/import-texts';
import { TakeBack } from '../count/take-back';
import type { EarlierFile } from './earlier-file';

/** The files taken in before; each can be taken back with all that it brought. */
export function EarlierFiles({ files, timeZone }: { files: readonly EarlierFile[]; timeZone: string }) {
  if (files.length === 0) return <p>{importTexts.none}</p>;
  const dayOf = (instant: string) => new Intl.DateTimeFormat('en-CA', { timeZone }).format(new Date(instant));
  return (
    <ul className="flex flex-col">
      {files.map((file) => (
        <li key={file.id} className="flex flex-wrap items-center justify-between gap-x-4 border-t border-rule py-3">
          <div className="min-w-0">
            <p className={`font-bold break-words ${file.takenBack ? 'line-through' : ''}`}>{file.fileName}</p>
            <p>
              {importTexts.earlierFile(importTexts.kinds[file.kind], countText(file.records, file.kind === 'counts' ? 'count' : 'tape sheet'), countText(file.lines, 'line'))}
              {'. '}
              {importTexts.earlierBy(dateText(dayOf(file.createdAt)), file.personName)}
            </p>
          </div>
          {file.takenBack ? <p className="font-bold">{importTexts.takenBack}</p> : <TakeBack targetKind="import" targetId={file.id} what={importTexts.whatImport(file.fileName)} />}
        </li>
      ))}
    </ul>
  );
}
