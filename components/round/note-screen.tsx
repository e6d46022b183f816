'use client';

import { v7 } from 'uuid';
import { useRound } from '@/lib/client/round/use-round';
import { useScreenDraft } from '@/lib/client/round/use-screen-draft';
import { noteCharactersMost } from '@/lib/schemas/field-limits';
import type { RoundField, RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import { Field } from '@/components/ui/field';
import { TextArea } from '@/components/ui/text-area';
import { noteTexts } from '@/lib/texts/round-condition-texts';
import { Screen } from './screen';

/** A note about a row, or about the whole field. */
export function NoteScreen({ planting, field, row }: { planting: RoundPlanting; field: RoundField; row: RoundRow | null }) {
  const round = useRound();
  const name = `note ${row?.id ?? planting.id}`;
  const { draft, change } = useScreenDraft(name, { text: '' });
  const keep = async () => {
    const text = draft.text.trim();
    if (text === '') return [noteTexts.needText];
    const { date, time } = round.now();
    const body = { plantingId: planting.id, rowSampleId: row?.id ?? null, notedOn: date, notedAt: time, text };
    await round.keep([{ kind: 'note.record', thingId: v7(), body, about: { plantingId: planting.id, rowSampleId: null } }], { clearDrafts: [name] });
    return [];
  };
  const before = planting.notes.filter((note) => note.rowSampleId === (row?.id ?? null));
  return (
    <Screen title={noteTexts.title} where={[row?.label, field.name].filter(Boolean).join(', ')} onKeep={keep}>
      <Field label={noteTexts.text}>{(wiring) => <TextArea {...wiring} rows={6} maxLength={noteCharactersMost} value={draft.text} onChange={(event) => change({ text: event.target.value })} />}</Field>
      {before.length > 0 ? (
        <section className="border-t-2 border-ink pt-2">
          <h2 className="text-18">{noteTexts.before}</h2>
          <ul>
            {[...before].reverse().map((note) => (
              <li key={note.id} className="border-b border-rule py-2 text-15">
                <span className="block">{note.notedOn}, {note.personName}</span>
                {note.text}
              </li>
            ))}
          </ul>
        </section>
      ) : null}
    </Screen>
  );
}
