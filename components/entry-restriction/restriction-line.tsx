'use client';

import { useState } from 'react';
import { TakeBack } from '@/components/count/take-back';
import { Button } from '@/components/ui/button';
import { countText } from '@/lib/format/count-text';
import { dateText } from '@/lib/format/date-text';
import { entryRestrictionTexts as texts } from '@/lib/texts/entry-restriction-texts';
import { RestrictionForm } from './restriction-form';
import type { RestrictionData } from './restriction-types';

type RestrictionLineProps = { fieldId: string; today: string; restriction: RestrictionData; mayWrite: boolean };

const hoursText = (hours: number) => (Number.isInteger(hours) ? countText(hours, 'hour') : `${hours} hours`);

/** One application: until when it keeps people out, and who went in before under which exception. */
export function RestrictionLine({ fieldId, today, restriction, mayWrite }: RestrictionLineProps) {
  const [correcting, setCorrecting] = useState(false);
  const { id, product, endedOn, endedAt, hours, personName, untilOn, untilAt, isOver, exceptions } = restriction;
  const until = `${dateText(untilOn)}, ${untilAt}`;
  return (
    <li className="border-t border-rule py-2">
      <div className="flex flex-wrap items-center justify-between gap-x-4">
        <div className="min-w-0 flex-1 basis-64 break-words">
          <p className={`text-18 ${isOver ? '' : 'font-bold text-flag-text'}`}>{isOver ? texts.over(product, until) : texts.outUntil(product, until)}</p>
          <p className="text-15">{[texts.ended(`${dateText(endedOn)}, ${endedAt}`, hoursText(hours)), texts.by(personName)].join(', ')}</p>
        </div>
        {mayWrite && !correcting ? (
          <div className="flex flex-wrap gap-2">
            <Button look="quiet" aria-label={texts.correctOf(product)} onClick={() => setCorrecting(true)}>
              {texts.correct}
            </Button>
            <TakeBack targetKind="entry-restriction" targetId={id} what={texts.restrictionOf(product, dateText(endedOn))} />
          </div>
        ) : null}
      </div>
      {correcting ? <RestrictionForm fieldId={fieldId} today={today} corrects={restriction} onDone={() => setCorrecting(false)} /> : null}
      {exceptions.length > 0 ? (
        <ul className="mt-1 pl-4">
          {exceptions.map((each) => (
            <li key={each.id} className="flex flex-wrap items-center justify-between gap-x-4">
              <p className="min-w-0 flex-1 basis-64 text-15 break-words">
                {texts.entered(each.personName, dateText(each.enteredOn))}. {texts.under(each.exception, each.equipment)}
              </p>
              {mayWrite ? <TakeBack targetKind="entry-exception" targetId={each.id} what={texts.exceptionOf(each.personName, dateText(each.enteredOn))} /> : null}
            </li>
          ))}
        </ul>
      ) : null}
    </li>
  );
}
