'use client';

import type { ReactNode } from 'react';
import { v7 } from 'uuid';
import { dayNumber, hasEnded } from '@/lib/client/round/due-row';
import type { RoundPlace } from '@/lib/client/round/round';
import { useRound } from '@/lib/client/round/use-round';
import { useScreenDraft } from '@/lib/client/round/use-screen-draft';
import { digNoteCharactersMost, digPlaceCharactersMost } from '@/lib/schemas/field-limits';
import { parseSeedingDepth } from '@/lib/schemas/seeding-depth';
import {
  crustThicknesses, digFindings, digPlaces, digPlants, digResidues, soilMoistures,
  type CrustThickness, type DepthUnit, type DigFinding, type DigPlace, type DigPlant, type DigResidue, type SoilMoisture,
} from '@/lib/schemas/vocabulary';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { TextArea } from '@/components/ui/text-area';
import { digTexts } from '@/lib/texts/round-dig-texts';
import { screenTexts, todayTexts } from '@/lib/texts/round-texts';
import { Choice } from './choice';
import { Screen } from './screen';
import { whereText } from './today-screen';

type DigDraft = {
  digId: string;
  pairId: string;
  plant: DigPlant;
  where: DigPlace | null;
  placeTyped: string;
  depthTyped: string;
  unit: DepthUnit;
  residue: DigResidue | null;
  moisture: SoilMoisture | null;
  crust: CrustThickness | null;
  found: DigFinding[];
  note: string;
};

const freshDig = (plant: DigPlant, pairId: string, where: DigPlace | null): DigDraft => ({
  digId: v7(), pairId, plant, where, placeTyped: '', depthTyped: '', unit: 'in', residue: null, moisture: null, crust: null, found: [], note: '',
});

const options = <Value extends string>(values: readonly Value[], words: Record<Value, string>) => values.map((value) => ({ value, label: words[value] }));

/** Why a plant is late or missing: dug in pairs, only where it destroys nothing that is still counted. */
export function DigScreen({ planting, row, photos }: RoundPlace & { photos: (digId: string) => ReactNode }) {
  const round = useRound();
  const name = `dig ${row.id}`;
  const standing = round.draft<DigDraft>(name);
  const { draft, change } = useScreenDraft<DigDraft>(name, standing ?? freshDig('late', v7(), null));
  const ended = hasEnded(row, planting);
  const where = ended ? draft.where : 'twin-length';
  const body = (): { problems: string[]; body: Record<string, unknown> } => {
    const parsed = draft.depthTyped.trim() === '' ? null : parseSeedingDepth(draft.depthTyped, draft.unit);
    const problems = [...(where === null ? [digTexts.where] : []), ...(parsed && !parsed.ok ? [parsed.message] : [])];
    const { pairId, plant, residue, moisture, crust, found } = draft;
    return {
      problems,
      body: {
        rowSampleId: row.id, visit: round.visit(row, null), pairId, plant, where, placeTyped: draft.placeTyped.trim() || null,
        depth: parsed ? { typed: draft.depthTyped.trim(), unit: draft.unit } : null, residue, moisture, crust, found, note: draft.note.trim() || null, replacesId: null,
      },
    };
  };
  const keep = async (neighborNext: boolean) => {
    const made = body();
    if (made.problems.length > 0) return made.problems;
    await round.keep([{ kind: 'dig.record', thingId: draft.digId, body: made.body, about: { plantingId: planting.id, rowSampleId: row.id } }], { clearDrafts: [name] });
    if (!neighborNext) return [];
    await round.setDraft(name, freshDig('neighbor', draft.pairId, where));
    // Not a problem but a reason to stay: the pair is not whole yet.
    return [digTexts.neighborNext];
  };
  const isLate = draft.plant === 'late';
  return (
    <Screen
      title={digTexts.title}
      where={[row.label, whereText(row)].filter(Boolean).join(', ')}
      caution={screenTexts.treatedSeed}
      onKeep={() => keep(isLate)}
      keepText={isLate ? digTexts.keepLate : digTexts.keep}
    >
      <p className="text-15 font-bold">{ended ? digTexts.ended : digTexts.notYet}</p>
      {ended ? (
        <Choice legend={digTexts.where} columns={1} options={digPlaces.map((value) => ({ value, label: digTexts.places[value] }))} chosen={draft.where ? [draft.where] : []} onPress={(value) => change({ where: value })} />
      ) : null}
      <Choice legend={digTexts.plant} columns={1} options={options(digPlants, digTexts.plants)} chosen={[draft.plant]} onPress={(plant) => change({ plant })} />
      <div className="grid grid-cols-2 gap-3">
        <Field label={digTexts.place} optionalText={digTexts.optional}>
          {(wiring) => <NumberInput {...wiring} maxLength={digPlaceCharactersMost} value={draft.placeTyped} onChange={(event) => change({ placeTyped: event.target.value })} />}
        </Field>
        <Field label={digTexts.depth} unit={draft.unit} optionalText={digTexts.optional}>
          {(wiring) => <NumberInput {...wiring} value={draft.depthTyped} onChange={(event) => change({ depthTyped: event.target.value })} />}
        </Field>
      </div>
      <Choice legend={digTexts.residue} columns={2} options={options(digResidues, digTexts.residues)} chosen={draft.residue ? [draft.residue] : []} onPress={(residue) => change({ residue })} />
      <Choice legend={digTexts.moisture} options={options(soilMoistures, digTexts.moistures)} chosen={draft.moisture ? [draft.moisture] : []} onPress={(moisture) => change({ moisture })} />
      <Choice legend={digTexts.crust} options={options(crustThicknesses, digTexts.crusts)} chosen={draft.crust ? [draft.crust] : []} onPress={(crust) => change({ crust })} />
      <Choice
        legend={digTexts.found}
        several
        columns={1}
        options={digFindings.map((value) => ({ value, label: digTexts.findings[value].found }))}
        chosen={draft.found}
        onPress={(value) => change({ found: draft.found.includes(value) ? draft.found.filter((each) => each !== value) : [...draft.found, value] })}
      />
      {draft.found.length > 0 ? (
        <div className="border-l-6 border-ink pl-3 text-15">
          {draft.found.map((value) => (
            <p key={value}>
              <span className="font-bold">{digTexts.findings[value].found}.</span> {digTexts.pointsTo} {digTexts.findings[value].pointsTo}.
            </p>
          ))}
          <p>{digTexts.suggests}</p>
        </div>
      ) : null}
      <Field label={digTexts.note} optionalText={digTexts.optional}>
        {(wiring) => <TextArea {...wiring} rows={2} maxLength={digNoteCharactersMost} value={draft.note} onChange={(event) => change({ note: event.target.value })} />}
      </Field>
      {photos(draft.digId)}
      {isLate ? (
        <Button look="secondary" wide onClick={() => void keep(false).then((problems) => problems.length === 0 && window.history.back())}>
          {digTexts.keepAlone}
        </Button>
      ) : null}
      {row.digs.length > 0 ? (
        <section className="border-t-2 border-ink pt-2">
          <h2 className="text-18">{digTexts.before}</h2>
          <ul className="text-15">
            {row.digs.map((dig) => (
              <li key={dig.id} className="border-b border-rule py-1">
                {todayTexts.day(dayNumber(planting.plantedOn, dig.visitedOn))}, {digTexts.plants[dig.plant as DigPlant]}
                {dig.depth ? `, ${dig.depth.typed} ${dig.depth.unit}` : ''}
                {dig.found.length > 0 ? `: ${dig.found.map((found) => digTexts.findings[found as DigFinding].found).join('; ')}` : ''}
              </li>
            ))}
          </ul>
        </section>
      ) : null}
    </Screen>
  );
}
