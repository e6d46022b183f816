'use client';

import Link from 'next/link';
import { OpeningForm } from '@/components/form/opening-form';
import { RemoveThing } from '@/components/form/remove-thing';
import { Disclosure } from '@/components/ui/disclosure';
import { EmptyState } from '@/components/ui/empty-state';
import { Section } from '@/components/ui/section';
import { useWho } from '@/lib/client/who';
import { readingText } from '@/lib/format/reading-text';
import { paths } from '@/lib/paths/paths';
import type { ReadingUnit } from '@/lib/schemas/vocabulary';
import { formTexts } from '@/lib/texts/form-texts';
import { rowSampleTexts } from '@/lib/texts/row-sample-texts';
import { LayRowSamples } from './lay-row-samples';
import { RowSampleForm, type PlannedRowSample } from './row-sample-form';

type RowSampleSectionProps = {
  plantingId: string;
  rowSpacing: { typed: string; unit: ReadingUnit; thousandths: number };
  samples: readonly PlannedRowSample[];
  strips: readonly { id: string; number: number }[];
  zones: readonly { id: string; name: string }[];
  mayWrite: boolean;
};

/** The places that are counted: laid out in the strips or free, and each changed or removed until it is counted. */
export function RowSampleSection({ plantingId, rowSpacing, samples, strips, zones, mayWrite }: RowSampleSectionProps) {
  const { organisationId } = useWho();
  const sorted = [...samples].sort((a, b) => a.label.localeCompare(b.label, 'en', { numeric: true }));
  const empty = strips.filter((strip) => !samples.some((sample) => sample.stripId === strip.id));
  const lay = { plantingId, rowSpacing, zones, labels: samples.map((sample) => sample.label) };
  return (
    <Section title={rowSampleTexts.title} lead={rowSampleTexts.lead}>
      {samples.length === 0 ? <EmptyState title={rowSampleTexts.none}>{rowSampleTexts.noneHint}</EmptyState> : null}
      <ul className="grid gap-x-8 md:grid-cols-2">
        {sorted.map((sample) => (
          <li key={sample.id} className="flex flex-wrap items-center justify-between gap-x-3 border-b border-rule py-1">
            <div className="flex min-w-0 flex-1 flex-wrap items-center justify-between gap-x-3">
              <p className="text-15">
                <Link className="font-mono font-bold" href={paths.rowSample(organisationId, plantingId, sample.id)}>
                  {sample.label}
                </Link>{' '}
                <span>{placeLine(sample, strips, zones)}</span>
              </p>
              {mayWrite && !sample.visited ? (
                <RemoveThing
                  noun="row-samples"
                  kind="row-sample.remove"
                  thing={sample}
                  label={rowSampleTexts.remove(sample.label)}
                  explanation={rowSampleTexts.removeExplanation}
                />
              ) : null}
            </div>
            {mayWrite ? (
              <OpeningForm
                label={formTexts.change}
                accessibleLabel={rowSampleTexts.change(sample.label)}
                look="quiet"
                form={(close) => (
                  <div className="w-full">
                    <RowSampleForm sample={sample} zones={zones} onDone={close} />
                  </div>
                )}
              />
            ) : null}
          </li>
        ))}
      </ul>
      {mayWrite && empty.length > 0 ? (
        <div className="flex flex-col gap-2">
          <h3 className="text-15 font-bold">{rowSampleTexts.inStrips}</h3>
          <LayRowSamples key={empty.length} {...lay} strips={empty} />
        </div>
      ) : null}
      {mayWrite ? (
        <Disclosure label={rowSampleTexts.free} openAtFirst={strips.length === 0 && samples.length === 0}>
          <LayRowSamples {...lay} strips={[]} />
        </Disclosure>
      ) : null}
    </Section>
  );
}

function placeLine(sample: PlannedRowSample, strips: RowSampleSectionProps['strips'], zones: RowSampleSectionProps['zones']): string {
  const strip = strips.find((each) => each.id === sample.stripId);
  return [
    readingText(sample.length),
    rowSampleTexts.endKinds[`${sample.startEnd}-${sample.farEnd}`],
    strip ? rowSampleTexts.strip(String(strip.number)) : null,
    sample.planterRow === null ? null : rowSampleTexts.row(String(sample.planterRow)),
    zones.find((each) => each.id === sample.zoneId)?.name ?? null,
    sample.visited ? rowSampleTexts.counted : null,
  ]
    .filter((part) => part !== null)
    .join(', ');
}
