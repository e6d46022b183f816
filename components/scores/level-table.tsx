'use client';

import { DataTable } from '@/components/ui/data-table';
import { ShallowLink } from '@/components/ui/shallow-link';
import type { TableCellData, TableColumn } from '@/components/ui/shown-rows';
import type { FigureId } from '@/lib/agronomy/figures';
import { useWho } from '@/lib/client/who';
import { percentText } from '@/lib/format/percent-text';
import { unitName } from '@/lib/format/unit-name';
import { scoreTexts } from '@/lib/texts/score-texts';
import { FigureOpener } from './figure-opener';
import type { FigureSubject } from './figure-subject';
import { plainFigure } from './plain-figure';
import type { ScoredThing } from './scored-things';
import { shownFigure } from './shown-figure';
import { SeriesName } from '@/components/charts/series-name';

type LevelTableProps = { things: readonly ScoredThing[]; caption: string; head: string; fileName: string; hrefOf: (id: string) => string };

const figureColumns = ['plantsPerAcre', 'shareOfSeed', 'daysTo50', 'spreadDays', 'lateShare', 'spacingInchesSd', 'spacingCv'] as const;

/** All things of a level with their figures side by side, for a desk: it sorts, filters and saves as a file. */
export function LevelTable({ things, caption, head, fileName, hrefOf }: LevelTableProps) {
  const { units } = useWho();
  const texts = scoreTexts.columns;
  const columns: TableColumn[] = [
    { key: 'name', head },
    ...figureColumns.map((id) => ({
      key: id,
      head:
        id === 'plantsPerAcre'
          ? unitName('plants-per-area', units)
          : id === 'spacingInchesSd'
            ? `${texts.spacingInchesSd}, ${unitName('spacing', units)}`
            : texts[id],
      align: 'number' as const,
    })),
    { key: 'multiples', head: texts.multiples, align: 'number' },
    { key: 'misses', head: texts.misses, align: 'number' },
    { key: 'score', head: texts.score, align: 'number' },
  ];
  const cell = (id: FigureId, subject: FigureSubject): TableCellData => {
    const shown = shownFigure(id, subject, units);
    const text = shown.sort === null ? shown.text : plainFigure(id, subject, units);
    return { text, sort: shown.sort, node: <FigureOpener id={id} subject={subject} text={text} /> };
  };
  const placementCell = (subject: FigureSubject, pick: 'multiplesShare' | 'missesShare'): TableCellData => {
    const { placement } = subject.figures;
    if (placement.kind === 'insufficient') return cell('placement', subject);
    const share = placement.value.ofSpacings[pick];
    const text = percentText(share, { decimals: 1 });
    return { text, sort: share, node: <FigureOpener id="placement" subject={subject} text={text} /> };
  };
  return (
    <DataTable
      caption={caption}
      columns={columns}
      filter={things.length > 8}
      fileName={fileName}
      emptyText={scoreTexts.nothing}
      rows={things.map((thing) => {
        const { subject } = thing;
        const name: TableCellData = {
          text: thing.detail ? `${thing.name}, ${thing.detail}` : thing.name,
          sort: thing.name,
          node: (
            <>
              <ShallowLink href={hrefOf(thing.id)} className="underline underline-offset-4">
                {thing.seriesIndex === null ? thing.name : <SeriesName index={thing.seriesIndex} name={thing.name} />}
              </ShallowLink>
              <span className="block text-13 font-normal text-ink-soft">{thing.detail || null}</span>
            </>
          ),
        };
        if (!subject) return { id: thing.id, cells: { name, plantsPerAcre: { text: thing.without ?? '', sort: null } } };
        return {
          id: thing.id,
          cells: {
            name,
            ...Object.fromEntries(figureColumns.map((id) => [id, cell(id, subject)])),
            multiples: placementCell(subject, 'multiplesShare'),
            misses: placementCell(subject, 'missesShare'),
            score: cell('score', subject),
          },
        };
      })}
    />
  );
}
