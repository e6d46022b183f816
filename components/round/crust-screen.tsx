'use client';

import { v7 } from 'uuid';
import { firstLookAgain } from '@/lib/agronomy/first-look-again';
import type { RoundPlace } from '@/lib/client/round/round';
import { useRound } from '@/lib/client/round/use-round';
import { useScreenDraft } from '@/lib/client/round/use-screen-draft';
import { wholeNumber } from '@/lib/client/round/whole-number';
import { sproutsMost } from '@/lib/schemas/field-limits';
import { crustThicknesses, type CrustThickness } from '@/lib/schemas/vocabulary';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { crustTexts } from '@/lib/texts/round-crust-texts';
import { screenTexts } from '@/lib/texts/round-texts';
import { Choice } from './choice';
import { Screen } from './screen';
import { whereText } from './today-screen';

/** Sound sprouts below a crust: what hoeing or waiting rests on. */
export function CrustScreen({ planting, row }: RoundPlace) {
  const round = useRound();
  const name = `crust ${row.id}`;
  const { draft, change } = useScreenDraft<{ sound: string; dead: string; crust: CrustThickness | null }>(name, { sound: '', dead: '', crust: null });
  const sound = wholeNumber(draft.sound, sproutsMost);
  const dead = wholeNumber(draft.dead, sproutsMost);
  const first = sound !== undefined && draft.crust !== null ? firstLookAgain({ soundSproutsPerAcre: sound, crusted: draft.crust !== 'none', damage: null, daysSinceDamage: null }) : undefined;
  const keep = async () => {
    const problems = [
      ...(sound === undefined ? [crustTexts.typeNumber(crustTexts.sound)] : []),
      ...(dead === undefined ? [crustTexts.typeNumber(crustTexts.dead)] : []),
      ...(draft.crust === null ? [crustTexts.chooseCrust] : []),
    ];
    if (problems.length > 0) return problems;
    const body = { rowSampleId: row.id, visit: round.visit(row, null), sproutsSound: sound, sproutsDead: dead, crust: draft.crust, replacesId: null };
    await round.keep([{ kind: 'crust.record', thingId: v7(), body, about: { plantingId: planting.id, rowSampleId: row.id } }], { clearDrafts: [name] });
    return [];
  };
  return (
    <Screen title={crustTexts.title} where={[row.label, whereText(row)].filter(Boolean).join(', ')} caution={screenTexts.treatedSeed} onKeep={keep}>
      <p className="text-15">{crustTexts.how}</p>
      <div className="grid grid-cols-2 items-end gap-3">
        <Field label={crustTexts.sound}>{(wiring) => <NumberInput {...wiring} inputMode="numeric" value={draft.sound} onChange={(event) => change({ sound: event.target.value })} />}</Field>
        <Field label={crustTexts.dead}>{(wiring) => <NumberInput {...wiring} inputMode="numeric" value={draft.dead} onChange={(event) => change({ dead: event.target.value })} />}</Field>
      </div>
      <Choice legend={crustTexts.crust} columns={1} options={crustThicknesses.map((value) => ({ value, label: crustTexts[value] }))} chosen={draft.crust ? [draft.crust] : []} onPress={(crust) => change({ crust })} />
      {first ? (
        <p role="status" className="border-l-6 border-ink pl-3 text-18">
          {first.answer === 'hoe' ? crustTexts.says.hoe(sound ?? 0) : first.answer === 'wait' ? crustTexts.says.wait(sound ?? 0) : crustTexts.says.decide}
        </p>
      ) : null}
    </Screen>
  );
}
