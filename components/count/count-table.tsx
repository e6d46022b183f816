import { DataTable } from '@/components/ui/data-table';
import type { TableCellData, TableRow } from '@/components/ui/shown-rows';
import { dateText } from '@/lib/format/date-text';
import { daysAfter } from '@/lib/format/days-after';
import { paths } from '@/lib/paths/paths';
import { countTexts } from '@/lib/texts/count-texts';
import type { CountRow, TableCount } from './count-table-types';
import { countingText, findingTexts } from './finding-texts';
import { rowPlaceText } from './row-place-text';

type CountTableProps = { org: string; plantingId: string; plantedOn: string; visitDays: readonly string[]; rows: readonly CountRow[] };

/** All row samples with their counts by visit day, for a desk. */
export function CountTable({ org, plantingId, plantedOn, visitDays, rows }: CountTableProps) {
  const anyFlag = rows.some((row) => findingTexts(row.findings).length > 0);
  return (
    <DataTable
      caption={countTexts.openPage}
      filter
      fileName="counts"
      emptyText={countTexts.none}
      columns={[
        { key: 'row', head: countTexts.rowSample },
        ...visitDays.map((day) => ({
          key: day,
          head: countTexts.visitHead(dateText(day, 'day-and-month'), String(daysAfter(plantedOn, day))),
          align: 'number' as const,
        })),
        { key: 'tape', head: countTexts.tape, align: 'number' },
        { key: 'counting', head: countTexts.counting },
        ...(anyFlag ? [{ key: 'flags', head: countTexts.toLookAt }] : []),
      ]}
      rows={rows.map((row): TableRow => {
        const flags = findingTexts(row.findings).join('; ');
        return {
          id: row.id,
          cells: {
            row: { text: row.label, detail: rowPlaceText(row.place), href: paths.rowSample(org, plantingId, row.id) },
            ...Object.fromEntries(visitDays.map((day) => [day, dayCell(row.counts.filter((count) => count.visitedOn === day))])),
            tape: row.findings.tapePlants === null ? { text: countTexts.notVisited, sort: null } : { text: String(row.findings.tapePlants), sort: row.findings.tapePlants },
            counting: { text: countingText(row.findings) },
            flags: { text: flags, sort: flags === '' ? null : flags, ...(flags === '' ? {} : { node: <span className="font-bold text-flag-text">{flags}</span> }) },
          },
        };
      })}
    />
  );
}

/** A day's counts: the used ones in order of time, what is doubtful of the last, and a second person's beside it. */
function dayCell(counts: readonly TableCount[]): TableCellData {
  const used = counts.filter((count) => count.used);
  const last = used.at(-1);
  if (!last) return { text: countTexts.notVisited, sort: null };
  const others = counts.filter((count) => !count.used).map((count) => countTexts.otherCount(String(count.plantsUp), count.personName));
  const details = [...(last.doubtful > 0 ? [countTexts.doubtfulOf(String(last.doubtful))] : []), ...others];
  return {
    text: used.map((count) => String(count.plantsUp)).join(', '),
    sort: last.plantsUp,
    ...(details.length > 0 ? { detail: details.join('; ') } : {}),
  };
}
