import { DataTable } from '@/components/ui/data-table';
import { dateText } from '@/lib/format/date-text';
import { decimalText } from '@/lib/format/decimal-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { unitName } from '@/lib/format/unit-name';
import type { ReplantBasis } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { replantTexts } from '@/lib/texts/replant-texts';
import { formulaName } from './formula-name';
import { TableOrigin } from './table-origin';

type RestsOnProps = {
  basis: ReplantBasis;
  units: UnitSystem;
  today: string;
  uncountedLabels?: readonly string[];
};

/** The counts behind the stand and the table behind the yields, with their age and origin. */
export function RestsOn({ basis, units, today, uncountedLabels = [] }: RestsOnProps) {
  const texts = replantTexts.rests;
  const draws = basis.answer.kind === 'value' ? basis.answer.overInterval?.draws : undefined;
  const isCorn = basis.crop === 'corn';
  const versions = Object.entries(basis.versions).map(([id, version]) => `${formulaName(id)} (${version})`);
  return (
    <>
      {isCorn ? <TableOrigin basis={basis} units={units} today={today} /> : null}
      <DataTable
        caption={texts.counts}
        captionShown
        columns={[
          { key: 'label', head: texts.label },
          ...(basis.countedRows.some(({ zoneName }) => zoneName) ? [{ key: 'zone', head: texts.zone }] : []),
          { key: 'stand', head: unitName('plants-per-area', units), align: 'number' as const },
          { key: 'seen', head: texts.seen, align: 'number' as const },
        ]}
        rows={basis.countedRows.map((row) => ({
          id: row.rowSampleId,
          cells: {
            label: { text: row.label },
            zone: { text: row.zoneName ?? texts.noZone },
            stand: {
              text: plantsPerAreaText(row.plantsPerAcre, units, { withUnit: false }),
              sort: row.plantsPerAcre,
            },
            seen: { text: dateText(row.lastSeenOn, 'day-and-month'), sort: row.lastSeenOn },
          },
        }))}
        fileName="stand-counts"
        emptyText={texts.noRows}
      />
      {uncountedLabels.length > 0 ? (
        <p className="text-13 text-ink-soft">{texts.uncounted(uncountedLabels.join(', '))}</p>
      ) : null}
      {isCorn ? (
        <p className="text-13 text-ink-soft">
          {draws ? `${texts.draws(decimalText(draws.draws, 0), String(draws.seed))} ` : ''}
          {texts.formulas(versions.join(', '))}
        </p>
      ) : null}
    </>
  );
}
