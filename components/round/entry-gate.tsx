'use client';

import { useState } from 'react';
import { v7 } from 'uuid';
import { hoursTyped } from '@/lib/client/round/hours-typed';
import { restrictedUntil } from '@/lib/client/round/restricted-until';
import { goTo, useAddress } from '@/lib/client/round/round-place';
import { useMinute } from '@/lib/client/round/use-minute';
import { useRound } from '@/lib/client/round/use-round';
import { useScreenDraft } from '@/lib/client/round/use-screen-draft';
import { dateText } from '@/lib/format/date-text';
import { equipmentCharactersMost, exceptionCharactersMost } from '@/lib/schemas/field-limits';
import type { RoundField } from '@/lib/schemas/round-day';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { TextInput } from '@/components/ui/text-input';
import { enterTexts } from '@/lib/texts/round-enter-texts';
import { roundTexts } from '@/lib/texts/round-texts';
import { RoundBar } from './round-bar';

/** Shown once a field and day before its first row: what keeps people out, then three short cautions. */
export function EntryGate({ field, onPassed }: { field: RoundField; onPassed: () => void }) {
  const round = useRound();
  const address = useAddress();
  useMinute();
  const [open, setOpen] = useState<'correct' | 'exception'>();
  const [problems, setProblems] = useState<readonly string[]>([]);
  const { draft, change, clear } = useScreenDraft(`gate ${field.id}`, { hours: '', exception: '', equipment: '' });
  const restricted = round.me ? restrictedUntil(field, round.now(), round.me.id) : undefined;
  const about = { plantingId: field.id, rowSampleId: null };
  const correct = async () => {
    const hours = hoursTyped(draft.hours);
    if (!restricted || hours === undefined) return setProblems([enterTexts.needHours]);
    const { product, endedOn, endedAt, id } = restricted.restriction;
    await round.keep([{ kind: 'entry-restriction.record', thingId: v7(), body: { fieldId: field.id, product, endedOn, endedAt, hours, replacesId: id }, about }]);
    done();
  };
  const except = async () => {
    const missing = [...(draft.exception.trim() === '' ? [enterTexts.needException] : []), ...(draft.equipment.trim() === '' ? [enterTexts.needEquipment] : [])];
    if (!restricted || missing.length > 0) return setProblems(missing);
    const body = { restrictionId: restricted.restriction.id, enteredOn: round.now().date, exception: draft.exception.trim(), equipment: draft.equipment.trim() };
    await round.keep([{ kind: 'entry-exception.record', thingId: v7(), body, about }]);
    done();
  };
  const done = () => {
    clear();
    setOpen(undefined);
    setProblems([]);
  };
  return (
    <RoundBar back={{ label: roundTexts.today, onPress: () => goTo({ ...address, at: 'today', planting: null, row: null }) }}>
      <div className="flex flex-col gap-4 px-4 pt-4 pb-8">
        <h1 className="text-27 leading-tight">{enterTexts.title(field.name)}</h1>
        {restricted ? (
          <>
            <div role="alert" className="border-l-6 border-flag pl-3">
              <p className="text-27 leading-tight font-bold text-flag-text">{enterTexts.closed(`${dateText(restricted.until.date)}, ${restricted.until.time}`)}</p>
              <p className="pt-2 text-18">
                {enterTexts.because(restricted.restriction.product, `${dateText(restricted.restriction.endedOn)}, ${restricted.restriction.endedAt}`, String(restricted.restriction.hours))} {enterTexts.recordedBy(restricted.restriction.personName)}
              </p>
            </div>
            <Button wide onClick={() => goTo({ ...address, at: 'today', planting: null, row: null })}>
              {enterTexts.back}
            </Button>
            <div className="grid grid-cols-2 gap-2">
              <Button look="secondary" aria-expanded={open === 'correct'} onClick={() => setOpen(open === 'correct' ? undefined : 'correct')}>
                {enterTexts.correct}
              </Button>
              <Button look="secondary" aria-expanded={open === 'exception'} onClick={() => setOpen(open === 'exception' ? undefined : 'exception')}>
                {enterTexts.exception}
              </Button>
            </div>
            {open === 'correct' ? (
              <div className="flex flex-col gap-3 border-t-2 border-ink pt-3">
                <Field label={enterTexts.correctHours} hint={enterTexts.hoursHint}>
                  {(wiring) => <NumberInput {...wiring} value={draft.hours} onChange={(event) => change({ hours: event.target.value })} />}
                </Field>
                <Button onClick={() => void correct().catch(() => undefined)}>{enterTexts.correctKeep}</Button>
              </div>
            ) : null}
            {open === 'exception' ? (
              <div className="flex flex-col gap-3 border-t-2 border-ink pt-3">
                <Field label={enterTexts.exceptionName} hint={enterTexts.exceptionHint}>
                  {(wiring) => <TextInput {...wiring} maxLength={exceptionCharactersMost} value={draft.exception} onChange={(event) => change({ exception: event.target.value })} />}
                </Field>
                <Field label={enterTexts.equipment}>
                  {(wiring) => <TextInput {...wiring} maxLength={equipmentCharactersMost} value={draft.equipment} onChange={(event) => change({ equipment: event.target.value })} />}
                </Field>
                <Button onClick={() => void except().catch(() => undefined)}>{enterTexts.exceptionKeep}</Button>
              </div>
            ) : null}
            {problems.map((problem) => (
              <p key={problem} role="alert" className="text-18 font-bold">
                {problem}
              </p>
            ))}
          </>
        ) : (
          <>
            <ul className="flex flex-col gap-3">
              {enterTexts.cautions.map((caution) => (
                <li key={caution} className="border-l-6 border-flag pl-3 text-18">
                  {caution}
                </li>
              ))}
            </ul>
            <p className="text-15">{enterTexts.labels}</p>
            <Button wide onClick={onPassed}>
              {enterTexts.enter}
            </Button>
          </>
        )}
      </div>
    </RoundBar>
  );
}
