import { register } from '@/lib/agronomy/register';
import { dateText } from '@/lib/format/date-text';
import { plantsPerAreaText } from '@/lib/format/plants-per-area-text';
import { percentText } from '@/lib/format/percent-text';
import { replantTexts } from '@/lib/texts/replant-texts';
import { entryOf, shownLine, tableLine, type ShownLine, type SumWords } from './sum-words';

const texts = replantTexts.sum;

/** What keeping makes, line by line. */
export function keepLines(words: SumWords): ShownLine[] {
  const { basis, answer, units } = words;
  const stand = basis.stand ? words.stand(basis.stand.plantsPerAcre) : '';
  const tableShare = texts.tableShare(dateText(basis.plantedOn, 'day-and-month'));
  const rows = basis.countedRows.map((row) => ({
    name: replantTexts.inputs.row(row.label),
    text: plantsPerAreaText(row.plantsPerAcre, units),
  }));
  return [
    shownLine({
      id: 'stand',
      label: texts.stand,
      text: stand,
      entry: register.plantsPerAcre,
      inputs: rows,
      ...(basis.stand?.places === 'zones' ? { note: replantTexts.weightedNote } : {}),
    }),
    tableLine('keep-table', basis.plantedOn, answer.keepReading, stand),
    fullYieldLine(words),
    ...lossLine(words, 'keep-gap-loss-share', texts.gapLoss),
    ...lossLine(words, 'keep-uneven-loss-share', texts.unevenLoss),
    shownLine({
      id: 'keep-yield',
      label: texts.keepYield,
      text: words.bounded(answer.keepYieldBushelsPerAcre, answer.keepReading),
      entry: entryOf('keep-or-replant'),
      inputs: [
        { name: replantTexts.inputs.fullYield, text: words.fullYield },
        { name: tableShare, text: words.percent('keep-table-share') },
        { name: texts.gapLoss, text: words.percent('keep-gap-loss-share') },
        { name: texts.unevenLoss, text: words.percent('keep-uneven-loss-share') },
      ],
      total: true,
    }),
  ];
}

/** What replanting makes, line by line. */
export function replantLines(words: SumWords): ShownLine[] {
  const { answer, typed, replantOn } = words;
  const stand = words.stand(answer.terms.replantPlantsPerAcre);
  const chance = { label: texts.poorChance, text: words.percent('poor-second-stand-chance') };
  const poor = { label: texts.poorYield, text: words.percent('poor-second-stand-yield-share') };
  const hasChance = words.amount('poor-second-stand-chance').upper > 0;
  return [
    shownLine({ id: 'second-stand', label: texts.secondStand, text: stand, inputs: typed }),
    tableLine('replant-table', replantOn, answer.replantReading, stand),
    ...(hasChance
      ? [
          shownLine({ id: 'poor-chance', ...chance, inputs: typed }),
          shownLine({ id: 'poor-yield', ...poor, inputs: typed }),
        ]
      : []),
    shownLine({
      id: 'replant-yield',
      label: texts.replantYield,
      text: words.bounded(answer.replantYieldBushelsPerAcre, answer.replantReading),
      entry: entryOf('keep-or-replant'),
      inputs: [
        { name: replantTexts.inputs.fullYield, text: words.fullYield },
        {
          name: texts.tableShare(dateText(replantOn, 'day-and-month')),
          text: words.percent('replant-table-share'),
        },
        ...[chance, poor].map(({ label, text }) => ({ name: label, text })),
      ],
      total: true,
    }),
  ];
}

function fullYieldLine({ basis, fullYield }: SumWords): ShownLine {
  const inputs = replantTexts.inputs;
  const from = basis.fullYield?.from === 'planting' ? inputs.fromPlan : inputs.fromSheet;
  return shownLine({
    id: 'full-yield',
    label: texts.ofFullYield,
    text: fullYield,
    inputs: [{ name: inputs.typed, text: from }],
  });
}

function lossLine(
  words: SumWords,
  id: 'keep-gap-loss-share' | 'keep-uneven-loss-share',
  label: string,
): ShownLine[] {
  const share = words.amount(id).upper;
  return share === 0
    ? []
    : [shownLine({ id, label, text: percentText(-share, { decimals: 1 }), inputs: words.typed })];
}
