'use client';

import { v7 } from 'uuid';
import { afterDepthPress, depthFigures, emptyDepths, type DepthDraft, type DepthPress } from '@/lib/client/round/depth-draft';
import type { RoundPlace } from '@/lib/client/round/round';
import { useRound } from '@/lib/client/round/use-round';
import { decimalText } from '@/lib/format/decimal-text';
import { parseSeedingDepth } from '@/lib/schemas/seeding-depth';
import { depthTexts } from '@/lib/texts/round-depth-texts';
import { screenTexts } from '@/lib/texts/round-texts';
import { Choice } from './choice';
import { Key } from './keypad';
import { Screen } from './screen';
import { whereText } from './today-screen';

const fractions = [
  { sign: '¼', text: '1/4' },
  { sign: '½', text: '1/2' },
  { sign: '¾', text: '3/4' },
];

/** How deep the seed of ten plants lies, the first suspect where a stand came up unevenly. */
export function DepthScreen({ planting, row }: RoundPlace) {
  const round = useRound();
  const name = `depth ${row.id}`;
  const draft = round.draft<DepthDraft>(name) ?? emptyDepths;
  const press = (pressed: DepthPress) => void round.setDraft(name, afterDepthPress(round.draft<DepthDraft>(name) ?? emptyDepths, pressed));
  const figures = depthFigures(draft.depths, draft.unit);
  const keep = async () => {
    const standing = round.draft<DepthDraft>(name) ?? emptyDepths;
    const whole = standing.current === '' ? standing : afterDepthPress(standing, { press: 'next' });
    if (whole.current !== '') {
      const parsed = parseSeedingDepth(whole.current, whole.unit);
      return [parsed.ok ? depthTexts.needOne : parsed.message];
    }
    if (whole.depths.length === 0) return [depthTexts.needOne];
    const body = { rowSampleId: row.id, visit: round.visit(row, null), unit: whole.unit, depths: whole.depths, replacesId: null };
    await round.keep([{ kind: 'depth.record', thingId: v7(), body, about: { plantingId: planting.id, rowSampleId: row.id } }], { clearDrafts: [name] });
    return [];
  };
  const typedCount = draft.depths.length + (draft.current === '' ? 0 : 1);
  return (
    <Screen title={depthTexts.title} where={[row.label, whereText(row)].filter(Boolean).join(', ')} caution={screenTexts.treatedSeed} onKeep={keep} keepText={depthTexts.keep(typedCount)}>
      <p className="text-15">{depthTexts.how}</p>
      {draft.depths.length === 0 ? (
        <Choice
          legend={depthTexts.unit}
          columns={2}
          options={[
            { value: 'in', label: depthTexts.inches },
            { value: 'cm', label: depthTexts.centimeters },
          ]}
          chosen={[draft.unit]}
          onPress={(unit) => press({ press: 'unit', unit })}
        />
      ) : (
        <ol aria-label={depthTexts.list} className="flex flex-wrap gap-x-4 font-mono text-18">
          {draft.depths.map((depth, index) => (
            <li key={index}>{depth}</li>
          ))}
        </ol>
      )}
      <p role="status" className="text-15 font-bold">
        {figures ? depthTexts.soFar(draft.depths.length, decimalText(figures.mean, 2), decimalText(figures.least, 2), decimalText(figures.most, 2), draft.unit) : depthTexts.none}
      </p>
      <div className="mt-auto">
        <p className="flex items-baseline justify-between">
          <span className="text-18 font-bold">{depthTexts.plant(draft.depths.length + 1)}</span>
          <output className="font-mono text-[3.5rem] leading-none font-bold">{draft.current || '–'}</output>
        </p>
        <div className="mt-2 grid grid-cols-4 gap-2">
          {[1, 2, 3].map((digit) => <Key key={digit} onPress={() => press({ press: 'key', text: String(digit) })}>{digit}</Key>)}
          {draft.unit === 'in' ? <Key label={fractions[0]?.text ?? ''} onPress={() => press({ press: 'key', text: '1/4' })}>¼</Key> : <Key onPress={() => press({ press: 'key', text: '.' })}>.</Key>}
          {[4, 5, 6].map((digit) => <Key key={digit} onPress={() => press({ press: 'key', text: String(digit) })}>{digit}</Key>)}
          {draft.unit === 'in' ? <Key label="1/2" onPress={() => press({ press: 'key', text: '1/2' })}>½</Key> : <Key onPress={() => press({ press: 'key', text: '.5' })}>.5</Key>}
          {[7, 8, 9].map((digit) => <Key key={digit} onPress={() => press({ press: 'key', text: String(digit) })}>{digit}</Key>)}
          {draft.unit === 'in' ? <Key label="3/4" onPress={() => press({ press: 'key', text: '3/4' })}>¾</Key> : <Key look="word" onPress={() => press({ press: 'back' })}>{depthTexts.back}</Key>}
          <Key look="word" onPress={() => press({ press: 'back' })}>{depthTexts.back}</Key>
          <Key onPress={() => press({ press: 'key', text: '0' })}>0</Key>
          <Key look="word" wide={2} onPress={() => press({ press: 'next' })}>{depthTexts.next}</Key>
        </div>
      </div>
    </Screen>
  );
}
