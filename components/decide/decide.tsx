'use client';

import { useSuspenseQuery } from '@tanstack/react-query';
import { useRef } from 'react';
import { Disclosure } from '@/components/ui/disclosure';
import { LinkTabs } from '@/components/ui/link-tabs';
import { Section } from '@/components/ui/section';
import { replantQuery } from '@/lib/client/queries/replant-query';
import { useWho } from '@/lib/client/who';
import { areaText } from '@/lib/format/area-text';
import { paths } from '@/lib/paths/paths';
import type { ReplantAnswer } from '@/lib/schemas/replant';
import { decisionTexts } from '@/lib/texts/decision-texts';
import { replantSheetTexts } from '@/lib/texts/replant-sheet-texts';
import { replantTexts } from '@/lib/texts/replant-texts';
import { Evidence } from './evidence';
import { Finding } from './finding';
import { FrozenDecision } from './frozen-decision';
import { OtherDecisions } from './other-decisions';
import { ReplantForm } from './replant-form';
import { RestsOn } from './rests-on';
import { SignButtons } from './sign-buttons';
import { SignedHead } from './signed-head';

type DecideProps = {
  org: string;
  planting: string;
  zone: string | null;
  maySign: boolean;
  mayWrite: boolean;
};

/** Keep or replant: the sentence, its evidence, the cautions and the signature; beside them the grower's own figures. */
export function Decide({ org, planting, zone, maySign, mayWrite }: DecideProps) {
  const { units, today } = useWho();
  const answer = useRef<HTMLDivElement>(null);
  const { data: replant } = useSuspenseQuery(replantQuery(org, planting, zone));
  const { basis, basisHash, decisions } = replant;
  const signed = decisions.find((each) => (each.zone?.id ?? null) === zone);
  const hasChanged = signed !== undefined && signed.basisHash !== basisHash;
  // Then the frozen evidence is the standing one, and is shown once.
  const isAsSigned = signed !== undefined && !hasChanged;
  // What was pressed stands far below the sentence that it changed.
  const showAnswer = () => {
    answer.current?.focus({ preventScroll: true });
    answer.current?.scrollIntoView();
  };
  const finding = { basis, units, today, countHref: paths.count(org, planting) };
  return (
    <div className="flex flex-col gap-6">
      <Scopes org={org} planting={planting} zone={zone} replant={replant} />
      <div className="grid grid-cols-1 gap-x-16 lg:grid-cols-[minmax(0,1fr)_24rem]">
        <div ref={answer} tabIndex={-1} className="min-w-0 outline-none">
          {signed ? (
            <SignedHead decision={signed} current={basis} hasChanged={hasChanged} units={units} />
          ) : (
            <Finding {...finding} />
          )}
          {signed ? (
            <Disclosure label={decisionTexts.restedOn} openAtFirst={isAsSigned}>
              <FrozenDecision decision={signed} units={units} />
            </Disclosure>
          ) : null}
          {signed && hasChanged ? (
            <Section title={decisionTexts.now}>
              <Finding {...finding} second />
            </Section>
          ) : null}
          {isAsSigned ? null : <Evidence basis={basis} units={units} />}
          {basis.answer.kind === 'value' ? (
            <Section
              title={signed ? decisionTexts.decideAnew : decisionTexts.title}
              {...(signed ? { lead: decisionTexts.decideAnewHelp } : {})}
            >
              <SignButtons replant={replant} maySign={maySign} onSigned={showAnswer} />
            </Section>
          ) : null}
        </div>
        <div className="min-w-0 lg:col-start-2 lg:row-span-2 lg:row-start-1">
          {mayWrite && basis.crop === 'corn' ? (
            <Section title={replantSheetTexts.title} lead={<FormLead replant={replant} />}>
              <ReplantForm key={zone ?? 'field'} replant={replant} onSaved={showAnswer} />
            </Section>
          ) : null}
        </div>
        <div className="min-w-0">
          {isAsSigned ? null : (
            <Section title={replantTexts.rests.title}>
              <RestsOn basis={basis} units={units} today={today} uncountedLabels={replant.uncountedLabels} />
            </Section>
          )}
          <OtherDecisions decisions={decisions.filter((each) => each !== signed)} units={units} />
        </div>
      </div>
    </div>
  );
}

function FormLead({ replant }: { replant: ReplantAnswer }) {
  const texts = replantSheetTexts;
  const isFields = replant.basis.zone !== null && replant.basis.sheet?.ofWholeField === true;
  return (
    <>
      <p>{texts.lead}</p>
      {replant.sheetSavedBy === null ? null : <p>{texts.savedBy(replant.sheetSavedBy)}</p>}
      {isFields ? <p>{texts.leadOfField}</p> : null}
    </>
  );
}

function Scopes({
  org,
  planting,
  zone,
  replant,
}: Pick<DecideProps, 'org' | 'planting' | 'zone'> & { replant: ReplantAnswer }) {
  const { units } = useWho();
  if (replant.zones.length === 0) return null;
  const here = paths.decide(org, planting);
  const fieldArea = replant.fieldAcres === null ? null : areaText(replant.fieldAcres, units);
  return (
    <LinkTabs
      label={replantTexts.scopes}
      tabs={[
        { label: replantTexts.scope(replantTexts.wholeField, fieldArea), href: here, current: zone === null },
        ...replant.zones.map(({ id, name, acres }) => ({
          label: replantTexts.scope(name, areaText(acres, units)),
          href: `${here}?zone=${id}`,
          current: zone === id,
        })),
      ]}
    />
  );
}
