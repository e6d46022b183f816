import { DataTable } from '@/components/ui/data-table';
import { Section } from '@/components/ui/section';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { importTexts } from '@/lib/texts/import-texts';
import type { ImportReading } from './import-reading';

const linesShown = 10;
const unbroken = (text: string) => text.replaceAll(' ', '\u00A0');

/** What was understood of a file: how much, where and when, and its first lines. */
export function ImportPreview({ reading }: { reading: ImportReading }) {
  const shown = reading.read.kind === 'counts' ? reading.read.lines.length : reading.read.sheets.length;
  if (shown === 0) return null;
  return (
    <Section title={importTexts.understood}>
      <p className="text-18">{summaryOf(reading)}</p>
      {reading.read.kind === 'counts' ? <CountLines lines={reading.read.lines} /> : <SheetLines sheets={reading.read.sheets} />}
    </Section>
  );
}

export function summaryOf({ read, rowSamples, days }: ImportReading): string {
  const [first, last] = [days[0], days.at(-1)];
  const when = first === undefined || last === undefined ? '' : first === last ? importTexts.onDay(dateText(first)) : importTexts.fromTo(dateText(first), dateText(last));
  const rows = countText(rowSamples.length, 'row sample');
  if (read.kind === 'counts') return importTexts.understoodCounts(countText(read.lines.length, 'count'), rows, when);
  const places = read.sheets.reduce((sum, sheet) => sum + sheet.places.length, 0);
  return importTexts.understoodSheets(countText(read.sheets.length, 'tape sheet'), countText(places, 'place'), rows, when);
}

function CountLines({ lines }: { lines: Extract<ImportReading['read'], { kind: 'counts' }>['lines'] }) {
  const shown = lines.slice(0, linesShown);
  const counted = shown[0]?.countedAs === 'new' ? importTexts.newSince : importTexts.soFar;
  return (
    <DataTable
      caption={shown.length < lines.length ? importTexts.firstLines(countText(shown.length, 'count')) : countText(shown.length, 'count')}
      captionShown
      emptyText=""
      columns={[
        { key: 'row', head: importTexts.rowSample, sortable: false },
        { key: 'date', head: importTexts.date, sortable: false },
        { key: 'time', head: importTexts.time, sortable: false },
        { key: 'plants', head: counted, align: 'number', sortable: false },
        { key: 'doubtful', head: importTexts.doubtful, align: 'number', sortable: false },
        { key: 'marker', head: importTexts.marker, sortable: false },
      ]}
      rows={shown.map((line) => ({
        id: String(line.line),
        cells: {
          row: { text: line.rowSample },
          date: { text: unbroken(dateText(line.date)) },
          time: { text: line.time ?? '' },
          plants: { text: String(line.plants) },
          doubtful: { text: String(line.doubtful) },
          marker: { text: line.marker ?? '' },
        },
      }))}
    />
  );
}

function SheetLines({ sheets }: { sheets: Extract<ImportReading['read'], { kind: 'tape-sheets' }>['sheets'] }) {
  const shown = sheets.slice(0, linesShown);
  return (
    <DataTable
      caption={shown.length < sheets.length ? importTexts.firstLines(countText(shown.length, 'tape sheet')) : countText(shown.length, 'tape sheet')}
      captionShown
      emptyText=""
      columns={[
        { key: 'row', head: importTexts.rowSample, sortable: false },
        { key: 'date', head: importTexts.date, sortable: false },
        { key: 'tape', head: importTexts.tape, sortable: false },
        { key: 'places', head: importTexts.places, align: 'number', sortable: false },
        { key: 'readings', head: importTexts.readings, sortable: false },
      ]}
      rows={shown.map((sheet) => ({
        id: String(sheet.line),
        cells: {
          row: { text: sheet.rowSample },
          date: { text: unbroken(dateText(sheet.date)) },
          tape: { text: sheet.tapeUnit },
          places: { text: String(sheet.places.length) },
          readings: { text: sheet.places.slice(0, linesShown).map((place) => place.typed).join('; ') },
        },
      }))}
    />
  );
}
