'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';
import { Field } from '@/components/ui/field';
import { TextArea } from '@/components/ui/text-area';
import { countText } from '@/lib/format/count-text';
import { parseTapePlace } from '@/lib/schemas/tape-place';
import { splitTapeReadings } from '@/lib/schemas/tape-readings';
import type { TapeUnit } from '@/lib/schemas/vocabulary';
import { tapeSheetTexts } from '@/lib/texts/tape-sheet-texts';

type PasteReadingsProps = { tapeUnit: TapeUnit; onAdd: (readings: string[]) => void };

/** A line of readings at once; what this tape cannot read stays in the box. */
export function PasteReadings({ tapeUnit, onAdd }: PasteReadingsProps) {
  const [text, setText] = useState('');
  const [said, setSaid] = useState<{ added: number; unread: readonly string[] }>();
  const fill = () => {
    const readings = splitTapeReadings(text, tapeUnit);
    const read = readings.filter((each) => parseTapePlace(each, tapeUnit).ok);
    const unread = readings.filter((each) => !read.includes(each));
    if (read.length > 0) onAdd(read);
    setText(unread.join('; '));
    setSaid({ added: read.length, unread });
  };
  return (
    <Disclosure label={tapeSheetTexts.paste}>
      <div className="flex flex-col items-start gap-3">
        <div className="w-full">
          <Field
            label={tapeSheetTexts.pasteLabel}
            error={said && said.unread.length > 0 ? tapeSheetTexts.notRead(said.unread.join('; ')) : undefined}
          >
            {(wiring) => <TextArea {...wiring} rows={3} value={text} onChange={(event) => setText(event.target.value)} />}
          </Field>
        </div>
        <Button look="secondary" onClick={fill}>
          {tapeSheetTexts.fill}
        </Button>
        <p role="status" className="font-bold">
          {said && said.added > 0 ? tapeSheetTexts.filled(countText(said.added, 'place')) : ''}
        </p>
      </div>
    </Disclosure>
  );
}
