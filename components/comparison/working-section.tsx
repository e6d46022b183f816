'use client';

import Link from 'next/link';
import { DataTable } from '@/components/ui/data-table';
import { Disclosure } from '@/components/ui/disclosure';
import { NumberSource } from '@/components/ui/number-source';
import { Section } from '@/components/ui/section';
import { inferenceRegister } from '@/lib/agronomy/register-inference';
import { useWho } from '@/lib/client/who';
import { decimalText } from '@/lib/format/decimal-text';
import { pValueText } from '@/lib/format/p-value-text';
import { paths } from '@/lib/paths/paths';
import type { TrialComparison } from '@/lib/schemas/comparison';
import { comparisonTexts } from '@/lib/texts/comparison-texts';
import { figureWords } from './figure-words';
import { comparedBy, settingOf } from './main-figure';

const texts = comparisonTexts.working;

const entryOf = (id: string) => inferenceRegister.find((entry) => entry.id === id);

/** The analysis behind the headline, number by number, for who wants to work it out again. */
export function WorkingSection({ comparison }: { comparison: TrialComparison }) {
  const { units } = useWho();
  const { trial, randomization } = comparison;
  const main = comparedBy(comparison, trial.mainFigure);
  const words = figureWords(trial.mainFigure, units);
  const nameOf = (id: string) => settingOf(comparison, id)?.name ?? id;
  const strips = main.strips.flatMap((strip) =>
    strip.value.kind === 'value'
      ? [
          {
            name: `${comparisonTexts.table.stripOf(strip.blockNumber, strip.number)}, ${nameOf(strip.settingId)}`,
            text: words.mean(strip.value.value.figure),
          },
        ]
      : [],
  );
  if (main.analysis.kind === 'insufficient') return null;
  const analysis = main.analysis.value;
  const whole = (count: number) => decimalText(count, 0);
  const facts: { name: string; text: string; entry: string | null }[] = [
    { name: texts.facts.rule, text: texts.rule[trial.rule], entry: trial.rule },
    { name: texts.facts.blocks, text: whole(analysis.blocks), entry: null },
    { name: texts.facts.strips, text: whole(analysis.strips), entry: null },
    { name: texts.facts.missing, text: whole(analysis.missingStrips), entry: null },
    { name: texts.facts.error, text: words.amount(analysis.errorSd), entry: 'block-interval' },
    { name: texts.facts.degrees, text: whole(analysis.errorDegreesOfFreedom), entry: null },
    {
      name: texts.facts.f,
      text: texts.fOn(decimalText(analysis.fRatio, 2), analysis.settingDegreesOfFreedom, analysis.errorDegreesOfFreedom),
      entry: 'block-interval',
    },
    { name: texts.facts.p, text: pValueText(analysis.p), entry: 'block-interval' },
    ...(randomization.kind === 'value'
      ? [
          { name: texts.facts.randomization, text: pValueText(randomization.value.p), entry: 'randomization-test' },
          { name: texts.facts.smallest, text: pValueText(randomization.value.smallestAttainableP), entry: 'layout' },
        ]
      : []),
  ];
  return (
    <Section title={texts.title} aside={<Link href={paths.methods}>{texts.methods}</Link>}>
      <dl className="grid gap-x-12 border-t border-rule md:grid-cols-2">
        {facts.map((fact) => {
          const entry = fact.entry === null ? undefined : entryOf(fact.entry);
          return (
            <div key={fact.name} className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-rule py-2">
              <dt className="text-15">{fact.name}</dt>
              <dd className="font-mono text-15">
                {entry ? <NumberSource label={fact.name} text={fact.text} entry={entry} inputs={strips} /> : fact.text}
              </dd>
            </div>
          );
        })}
      </dl>
      <Disclosure label={texts.pairs}>
        <DataTable
          caption={texts.pairs}
          fileName="pairs"
          emptyText=""
          columns={[
            { key: 'first', head: texts.first },
            { key: 'second', head: texts.second },
            { key: 'difference', head: words.head, align: 'number' },
            { key: 'interval', head: texts.interval, align: 'number' },
            { key: 'p', head: texts.p, align: 'number' },
            { key: 'told', head: texts.told },
          ]}
          rows={main.differences.map((pair) => ({
            id: `${pair.first} ${pair.second}`,
            cells: {
              first: { text: nameOf(pair.first) },
              second: { text: nameOf(pair.second) },
              difference: { text: words.signed(pair.difference), sort: pair.difference },
              interval: { text: words.signedRange(pair.lower, pair.upper), sort: pair.lower },
              p: { text: pValueText(pair.p), sort: pair.p },
              told: { text: !trial.isLocked ? texts.notClaimed : pair.toldApart ? texts.yes : texts.no },
            },
          }))}
        />
      </Disclosure>
    </Section>
  );
}
