import { dateText } from '@/lib/format/date-text';
import type { ReplantBasis, ReplantValue } from '@/lib/schemas/replant';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { replantTexts } from '@/lib/texts/replant-texts';
import { moneyLines } from './money-lines';
import { SumLine } from './sum-line';
import { sumWords, type ShownLine } from './sum-words';
import { keepLines, replantLines } from './yield-lines';

type ReplantSumProps = { basis: ReplantBasis; answer: ReplantValue; units: UnitSystem };

/** The sum as a grower would write it: what keeping makes, what replanting makes, and the dollars between them. */
export function ReplantSum({ basis, answer, units }: ReplantSumProps) {
  const texts = replantTexts.sum;
  const words = sumWords(basis, answer, units);
  const hasCosts = answer.lines.some(({ id }) => id === 'replant-cost');
  return (
    <div className="flex flex-col gap-5">
      <Part head={texts.keepHead(dateText(basis.plantedOn, 'day-and-month'))} lines={keepLines(words)} />
      <Part
        head={texts.replantHead(dateText(words.replantOn, 'day-and-month'))}
        lines={replantLines(words)}
      />
      <Part head={texts.moneyHead[units]} lines={moneyLines(words)} />
      {hasCosts ? null : <p className="text-15 font-bold">{texts.noCosts}</p>}
      {basis.acres === null ? <p className="text-13 text-ink-soft">{texts.noField}</p> : null}
    </div>
  );
}

function Part({ head, lines }: { head: string; lines: readonly ShownLine[] }) {
  return (
    <div>
      <h3 className="pb-1 text-15">{head}</h3>
      <dl>
        {lines.map(({ id, ...line }) => (
          <SumLine key={id} {...line} />
        ))}
      </dl>
    </div>
  );
}
