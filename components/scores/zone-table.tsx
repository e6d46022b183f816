'use client';

import { DataTable } from '@/components/ui/data-table';
import { useWho } from '@/lib/client/who';
import { areaText } from '@/lib/format/area-text';
import { countText } from '@/lib/format/count-text';
import { decimalText } from '@/lib/format/decimal-text';
import { percentText } from '@/lib/format/percent-text';
import { unitName } from '@/lib/format/unit-name';
import type { Scores } from '@/lib/schemas/scores';
import { scoreTexts } from '@/lib/texts/score-texts';
import { FigureOpener } from './figure-opener';
import type { FigureSubject } from './figure-subject';
import { plainFigure } from './plain-figure';
import { shownFigure } from './shown-figure';

/** The parts of a field that are counted apart, and what each weighs in the stand of the whole. */
export function ZoneTable({ scores }: { scores: Scores }) {
  const { units } = useWho();
  const { zoneStand, zones, planting } = scores;
  const texts = scoreTexts.zones;
  if (!zoneStand) return null;
  const figureCell = (id: 'plantsPerAcre' | 'shareOfSeed', subject: FigureSubject) => {
    const shown = shownFigure(id, subject, units);
    const text = shown.sort === null ? shown.text : plainFigure(id, subject, units);
    return { text, sort: shown.sort, detail: shown.detail ?? '', node: <FigureOpener id={id} subject={subject} text={text} /> };
  };
  return (
    <div className="flex flex-col gap-3">
      <DataTable
        caption={scoreTexts.sections.zones}
        columns={[
          { key: 'name', head: scoreTexts.sections.zones },
          { key: 'plantsPerAcre', head: unitName('plants-per-area', units), align: 'number' },
          { key: 'shareOfSeed', head: scoreTexts.columns.shareOfSeed, align: 'number' },
          { key: 'area', head: texts.area, align: 'number' },
          { key: 'share', head: texts.share, align: 'number' },
          { key: 'rowSamples', head: texts.rowSamples, align: 'number' },
        ]}
        rows={zones.map((zone) => {
          const subject: FigureSubject = { planting, ...zone, row: null };
          return {
            id: zone.zoneId ?? 'rest',
            cells: {
              name: { text: zone.name ?? scoreTexts.restOfField },
              plantsPerAcre: { ...figureCell('plantsPerAcre', subject), detail: '' },
              shareOfSeed: { ...figureCell('shareOfSeed', subject), detail: '' },
              area: { text: areaText(zone.acres, units), sort: zone.acres },
              share: { text: percentText(zone.areaShare), sort: zone.areaShare },
              rowSamples: { text: decimalText(zone.pooled.rowSamples, 0), sort: zone.pooled.rowSamples },
            },
          };
        })}
        fileName="zones"
        emptyText=""
      />
      <ul className="flex max-w-reading flex-col gap-1 text-13 text-ink-soft">
        <li>
          {zoneStand.stand.kind === 'value' ? texts.weighted(zones.length) : texts.notWeighted(zoneStand.stand.had)}
        </li>
        {zoneStand.acresNotSampled > 0 ? <li>{texts.notSampled(areaText(zoneStand.acresNotSampled, units))}</li> : null}
        {zoneStand.rowSamplesOutside > 0 ? <li>{texts.outside(countText(zoneStand.rowSamplesOutside, 'row sample'))}</li> : null}
      </ul>
    </div>
  );
}
