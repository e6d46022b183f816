import { dateText } from '@/lib/format/date-text';
import { daysAfter } from '@/lib/format/days-after';
import { fieldRecordTexts } from '@/lib/texts/field-record-texts';

/** When and by whom, as the small line under a record says it. What was read before planting names no day after it. */
export function recordDay(plantedOn: string, record: { on: string; at?: string | null; personName: string }): string[] {
  const date = dateText(record.on);
  return [
    record.on < plantedOn ? date : fieldRecordTexts.on(date, String(daysAfter(plantedOn, record.on))),
    ...(record.at ? [record.at] : []),
    fieldRecordTexts.by(record.personName),
  ];
}
