'use client';

import { v7 } from 'uuid';
import { hoursTyped } from '@/lib/client/round/hours-typed';
import { useRound } from '@/lib/client/round/use-round';
import { useScreenDraft } from '@/lib/client/round/use-screen-draft';
import { productCharactersMost } from '@/lib/schemas/field-limits';
import type { RoundField } from '@/lib/schemas/round-day';
import { dateText } from '@/lib/format/date-text';
import { DateInput } from '@/components/ui/date-input';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { TextInput } from '@/components/ui/text-input';
import { enterTexts } from '@/lib/texts/round-enter-texts';
import { Screen } from './screen';

/** What a sign at the field says: the product, when it ended, for how long nobody enters. */
export function SprayingScreen({ field }: { field: RoundField }) {
  const round = useRound();
  const name = `spraying ${field.id}`;
  const { draft, change } = useScreenDraft(name, { product: '', endedOn: round.now().date, endedAt: '', hours: '' });
  const keep = async () => {
    const hours = hoursTyped(draft.hours);
    const problems = [
      ...(draft.product.trim() === '' ? [enterTexts.needProduct] : []),
      ...(/^\d{4}-\d{2}-\d{2}$/.test(draft.endedOn) && /^\d{2}:\d{2}$/.test(draft.endedAt) ? [] : [enterTexts.needTime]),
      ...(hours === undefined ? [enterTexts.needHours] : []),
    ];
    if (problems.length > 0) return problems;
    const body = { fieldId: field.id, product: draft.product.trim(), endedOn: draft.endedOn, endedAt: draft.endedAt, hours, replacesId: null };
    await round.keep([{ kind: 'entry-restriction.record', thingId: v7(), body, about: { plantingId: field.id, rowSampleId: null } }], { clearDrafts: [name] });
    return [];
  };
  return (
    <Screen title={enterTexts.spraying} where={field.name} onKeep={keep}>
      <p className="text-15">{enterTexts.sprayingHow}</p>
      <Field label={enterTexts.product}>{(wiring) => <TextInput {...wiring} maxLength={productCharactersMost} value={draft.product} onChange={(event) => change({ product: event.target.value })} />}</Field>
      <div className="grid grid-cols-2 gap-3">
        <Field label={enterTexts.endedOn}>{(wiring) => <DateInput {...wiring} value={draft.endedOn} onChange={(event) => change({ endedOn: event.target.value })} />}</Field>
        <Field label={enterTexts.endedAt}>{(wiring) => <TextInput {...wiring} type="time" value={draft.endedAt} onChange={(event) => change({ endedAt: event.target.value })} />}</Field>
      </div>
      <Field label={enterTexts.hours} hint={enterTexts.hoursHint}>{(wiring) => <NumberInput {...wiring} value={draft.hours} onChange={(event) => change({ hours: event.target.value })} />}</Field>
      {field.restrictions.length > 0 ? (
        <section className="border-t-2 border-ink pt-2">
          <h2 className="text-18">{enterTexts.standing}</h2>
          <ul className="text-15">
            {field.restrictions.map((each) => (
              <li key={each.id} className="border-b border-rule py-2">
                {enterTexts.because(each.product, `${dateText(each.endedOn)}, ${each.endedAt}`, String(each.hours))}
              </li>
            ))}
          </ul>
        </section>
      ) : null}
    </Screen>
  );
}
