'use client';

import { v7 } from 'uuid';
import { rowLengthFeet } from '@/lib/agronomy/row-length';
import { placesSoFar, placesWanted } from '@/lib/client/round/another-place';
import { usedCounts } from '@/lib/client/round/due-row';
import { useRound } from '@/lib/client/round/use-round';
import { useScreenDraft } from '@/lib/client/round/use-screen-draft';
import { wholeNumber } from '@/lib/client/round/whole-number';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { rowLengthText } from '@/lib/format/row-length-text';
import { plantsMost } from '@/lib/schemas/field-limits';
import { parseReading } from '@/lib/schemas/reading';
import { rowLengthRule } from '@/lib/schemas/reading-rules';
import type { RoundField, RoundPlanting } from '@/lib/schemas/round-day';
import { plantsPerAcre } from '@/lib/agronomy/stand';
import { plantsHeld } from '@/lib/agronomy/plants-held';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { spotTexts } from '@/lib/texts/round-spot-texts';
import { Screen } from './screen';

const feetPerInch = 12;
/** A difference of fewer plants per acre on each side changes no decision. */
const narrowerLittle = 300;

/** Place after place, each counted in a measured length, and what they say together as one goes. */
export function SpotPlaces({ planting, field }: { planting: RoundPlanting; field: RoundField }) {
  const round = useRound();
  const units = round.me?.units ?? 'us';
  const name = `spot ${planting.id}`;
  const number = planting.rows.length + 1;
  const suggested = rowLengthText(rowLengthFeet(planting.rowSpacingInches) * feetPerInch, units);
  const { draft, change } = useScreenDraft(name, { length: suggested, plants: '', doubtful: '' });
  const keep = async () => {
    const plants = wholeNumber(draft.plants, plantsMost);
    const doubtful = draft.doubtful.trim() === '' ? 0 : wholeNumber(draft.doubtful, plantsMost);
    const length = parseReading(draft.length, rowLengthRule);
    const problems = [
      length.ok ? undefined : length.message,
      plants === undefined || doubtful === undefined ? spotTexts.needPlants : doubtful > plants ? spotTexts.tooManyDoubtful : undefined,
    ].filter((problem) => problem !== undefined);
    if (problems.length > 0 || plants === undefined) return problems;
    const rowSampleId = v7();
    const { date, time } = round.now();
    await round.keep(
      [
        {
          kind: 'spot-place.add', thingId: rowSampleId, about: { plantingId: planting.id, rowSampleId: null },
          body: { plantingId: planting.id, zoneId: null, label: freeLabel(planting), length: { typed: draft.length.trim() }, startEnd: 'mark', farEnd: 'mark' },
        },
        {
          kind: 'count.record', thingId: v7(), about: { plantingId: planting.id, rowSampleId },
          body: { rowSampleId, visit: { id: v7(), personId: null, visitedOn: date, visitedAt: time, marker: null }, countedAs: 'so-far', plants, doubtful, replacesId: null },
        },
      ],
      { clearDrafts: [name] },
    );
    // The same length goes on to the next place.
    await round.setDraft(name, { length: draft.length, plants: '', doubtful: '' });
    return [];
  };
  const stands = planting.rows.flatMap((row) => {
    const last = usedCounts(row).at(-1);
    if (!last || row.length.inches <= 0) return [];
    const held = plantsHeld({ plantsUp: last.plantsUp, plantsDoubtful: last.doubtful, startEnd: row.startEnd, farEnd: row.farEnd });
    return [{ label: row.label, perAcre: plantsPerAcre({ plantsHeld: held, lengthInches: row.length.inches, rowSpacingInches: planting.rowSpacingInches }) }];
  });
  const soFar = placesSoFar(stands.map((each) => each.perAcre));
  const perArea = (plants: number) => plantsPerAreaText(plants, units, { nearest: 100 });
  return (
    <Screen title={spotTexts.place(number)} where={field.name} onKeep={keep} keepText={spotTexts.keepPlace} after={{ at: 'spot', planting: planting.id }}>
      <Field label={spotTexts.length} hint={spotTexts.lengthHint(suggested)}>
        {(wiring) => <NumberInput {...wiring} value={draft.length} onChange={(event) => change({ length: event.target.value })} />}
      </Field>
      <div className="grid grid-cols-2 gap-3">
        <Field label={spotTexts.plants}>{(wiring) => <NumberInput {...wiring} inputMode="numeric" value={draft.plants} onChange={(event) => change({ plants: event.target.value })} />}</Field>
        <Field label={spotTexts.doubtful}>{(wiring) => <NumberInput {...wiring} inputMode="numeric" value={draft.doubtful} onChange={(event) => change({ doubtful: event.target.value })} />}</Field>
      </div>
      <section role="status" className="border-t-2 border-ink pt-2">
        <h2 className="text-18">{spotTexts.soFar}</h2>
        {soFar.answer === 'insufficient' ? (
          <p className="text-18">{soFar.places === 0 ? spotTexts.none : `${perArea(stands[0]?.perAcre ?? 0)}. ${spotTexts.one}`}</p>
        ) : (
          <>
            <p className="text-21 font-bold">{spotTexts.mean(perArea(soFar.mean), soFar.places)}</p>
            <p className="text-18">{spotTexts.interval(plantsPerAreaText(soFar.lower, units, { nearest: 100, withUnit: false }), perArea(soFar.upper))}</p>
            <p className="text-18">
              {soFar.places < placesWanted ? spotTexts.fewer(placesWanted, soFar.places) : soFar.narrowerBy < narrowerLittle ? spotTexts.enough : spotTexts.another(perArea(soFar.narrowerBy))}
            </p>
          </>
        )}
        <ul className="pt-2">
          {stands.map((stand) => (
            <li key={stand.label} className="flex justify-between border-b border-rule py-1 text-15">
              <span>{stand.label}</span>
              <span className="font-mono">{perArea(stand.perAcre)}</span>
            </li>
          ))}
        </ul>
      </section>
    </Screen>
  );
}

/** P1, P2 …: the first that no place of the planting has. */
function freeLabel(planting: RoundPlanting): string {
  const taken = new Set(planting.rows.map((row) => row.label.toUpperCase()));
  let number = planting.rows.length + 1;
  while (taken.has(`P${number}`)) number += 1;
  return `P${number}`;
}
