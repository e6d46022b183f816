import { areaText } from '@/lib/format/area-text';
import { moneyText } from '@/lib/format/money-text';
import { priceText } from '@/lib/format/price-text';
import { replantTexts } from '@/lib/texts/replant-texts';
import { entryOf, shownLine, type ShownLine, type SumWords } from './sum-words';

const texts = replantTexts.sum;
const paidIds = ['replant-cost', 'extra-drying', 'insurance-payment'];

/** From the difference in yield to the dollars an area and for the field; what is paid out is negative. */
export function moneyLines(words: SumWords): ShownLine[] {
  const { answer, units, typed } = words;
  const change = changeLine(words);
  const paid = answer.lines
    .filter(({ id }) => paidIds.includes(id))
    .map((each, index) =>
      shownLine({
        id: `${each.id} ${index}`,
        label: each.label ?? (each.id === 'extra-drying' ? texts.extraDrying : texts.insurancePayment),
        text: words.dollars(each.amount.upper),
        inputs: typed,
      }),
    );
  const gain = shownLine({
    id: 'gain',
    label: texts.gain[units],
    text: words.between(answer.gainDollarsPerAcre, (amount) => words.dollars(amount)),
    entry: entryOf('keep-or-replant'),
    inputs: [
      ...[change, ...paid].map(({ name, text }) => ({ name, text })),
      { name: replantTexts.inputs.rounding, text: words.dollars(answer.tableRoundingDollarsPerAcre, false) },
    ],
    total: true,
  });
  return [change, ...paid, gain, ...fieldLine(words, gain)];
}

function changeLine(words: SumWords): ShownLine {
  const { answer, units } = words;
  const change = words.amount('yield-change');
  const price = priceText(answer.terms.priceDollarsPerBushel, units);
  const isExact = change.lower === change.upper;
  return shownLine({
    id: 'change',
    label: isExact
      ? texts.yieldChange(change.upper > 0, words.yieldOf(Math.abs(change.upper)), price)
      : texts.yieldChangeBounded(price),
    text: words.between(words.amount('yield-change-value'), (amount) => words.dollars(amount)),
    entry: entryOf('keep-or-replant'),
    inputs: [
      {
        name: texts.replantYield,
        text: words.bounded(answer.replantYieldBushelsPerAcre, answer.replantReading),
      },
      { name: texts.keepYield, text: words.bounded(answer.keepYieldBushelsPerAcre, answer.keepReading) },
      { name: replantTexts.inputs.price, text: price },
    ],
  });
}

function fieldLine({ answer, basis, units, between }: SumWords, gain: ShownLine): ShownLine[] {
  if (!answer.gainDollarsField || basis.acres === null) return [];
  const area = areaText(basis.acres, units);
  return [
    shownLine({
      id: 'field',
      label: texts.gainField(area),
      text: between(answer.gainDollarsField, (amount) => moneyText(amount, { signed: true })),
      inputs: [
        { name: gain.name, text: gain.text },
        { name: basis.zone?.name ?? replantTexts.wholeField, text: area },
      ],
    }),
  ];
}
