'use client';

import { useState } from 'react';
import { TapeLegend } from '@/components/tape/tape-legend';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { Section } from '@/components/ui/section';
import { useKeptDraft } from '@/lib/client/use-kept-draft';
import { useWho } from '@/lib/client/who';
import { countText } from '@/lib/format/count-text';
import { countTexts } from '@/lib/texts/count-texts';
import { tapeSheetTexts } from '@/lib/texts/tape-sheet-texts';
import type { RowSheetData } from '../count/row-sheet-types';
import { StandingTapeSheet } from './standing-tape-sheet';
import { correctingTapeSheet, emptyTapeSheet, tapeSheetDraftSchema, type TapeSheetDraft } from './tape-sheet-draft';
import { TapeSheetEntry } from './tape-sheet-entry';

/** The tape sheets of a row sample, and the sheet to type one in; what is being typed is kept until it is saved. */
export function TapeSection({ data }: { data: RowSheetData }) {
  const { row, tapeSheets, findings, counts, today, me, mayWrite } = data;
  const { units } = useWho();
  const [kept, keep] = useKeptDraft<TapeSheetDraft>(`tape-sheet ${row.id}`, tapeSheetDraftSchema);
  const [saved, setSaved] = useState(false);
  const start = () => {
    setSaved(false);
    keep(() => emptyTapeSheet({ counts, today, me, tapeUnit: units === 'us' ? 'in' : 'cm' }));
  };
  return (
    <Section title={tapeSheetTexts.section}>
      {findings.tapeLessCounted !== null && findings.tapeLessCounted !== 0 ? <Disagreement findings={findings} /> : null}
      {tapeSheets.length === 0 && !kept ? <p className="text-18">{tapeSheetTexts.none}</p> : null}
      {[...tapeSheets].reverse().map((sheet) => (
        <StandingTapeSheet
          key={sheet.id}
          data={data}
          sheet={sheet}
          onCorrect={() => {
            setSaved(false);
            keep(() => correctingTapeSheet(sheet));
          }}
        />
      ))}
      <p role="status" className="text-18 font-bold empty:hidden">
        {saved ? tapeSheetTexts.saved : ''}
      </p>
      {mayWrite && kept ? (
        <TapeSheetEntry
          key={kept.sheetId}
          data={data}
          draft={kept}
          onChange={(draft) => keep(() => draft)}
          onClear={() => keep(() => undefined)}
          onSaved={() => {
            setSaved(true);
            keep(() => undefined);
          }}
        />
      ) : null}
      {mayWrite && !kept ? (
        <div>
          <Button look={tapeSheets.length === 0 ? 'primary' : 'secondary'} onClick={start}>
            {tapeSheets.length === 0 ? tapeSheetTexts.enterTitle : tapeSheetTexts.enterNew}
          </Button>
        </div>
      ) : null}
      <TapeLegend />
    </Section>
  );
}

/** Where tape sheet and counts differ, both stand, with the difference. */
function Disagreement({ findings }: { findings: RowSheetData['findings'] }) {
  const { tapePlants, lastPlantsUp, tapeLessCounted } = findings;
  if (tapePlants === null || lastPlantsUp === null || tapeLessCounted === null) return null;
  const apart = countText(Math.abs(tapeLessCounted), 'plant');
  return (
    <Notice>
      <p>
        {countTexts.disagree(
          countText(tapePlants, 'plant'),
          String(lastPlantsUp),
          tapeLessCounted < 0 ? countTexts.fewer(apart) : countTexts.more(apart),
        )}
      </p>
    </Notice>
  );
}
