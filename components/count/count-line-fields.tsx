import { Button } from '@/components/ui/button';
import { DateInput } from '@/components/ui/date-input';
import { Field } from '@/components/ui/field';
import { NumberInput } from '@/components/ui/number-input';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { countKinds, type CountKind } from '@/lib/schemas/vocabulary';
import { countTexts } from '@/lib/texts/count-texts';
import type { CountLine } from './count-line-draft';

type CountLineFieldsProps = {
  line: CountLine;
  number: number;
  /** What is wrong, by the path in the body. */
  errors: ReadonlyMap<string, string>;
  onChange: (line: CountLine) => void;
  onRemove: (() => void) | undefined;
  /** Enter in the last field goes on to the next line. */
  onEnter: () => void;
};

const kindOptions = countKinds.map((kind) => ({ value: kind, label: countTexts.kinds[kind] }));

export const plantsFieldId = (countId: string) => `plants-${countId}`;

/** One visit of a paper sheet: a block of fields on a phone, a line of them at a desk. */
export function CountLineFields({ line, number, errors, onChange, onRemove, onEnter }: CountLineFieldsProps) {
  const idOf = (field: string) => `${field}-${line.countId}`;
  const set = (changed: Partial<CountLine>) => onChange({ ...line, ...changed });
  const markerError = errors.get('visit.marker');
  return (
    <div
      className="grid grid-cols-[minmax(0,1.25fr)_minmax(0,1fr)] items-start gap-x-3 gap-y-2 md:grid-cols-[minmax(12rem,1.3fr)_10rem_minmax(0,1fr)_minmax(0,1fr)_minmax(0,1.2fr)_minmax(0,1.8fr)_auto]"
      onKeyDown={(event) => {
        if (event.key !== 'Enter' || !(event.target instanceof HTMLInputElement)) return;
        event.preventDefault();
        onEnter();
      }}
    >
      <Field label={countTexts.date} id={idOf('date')} error={errors.get('visit.visitedOn')}>
        {(wiring) => <DateInput {...wiring} value={line.date} onChange={(event) => set({ date: event.target.value })} />}
      </Field>
      <Field label={countTexts.time} id={idOf('time')} error={errors.get('visit.visitedAt')}>
        {(wiring) => <TextInput {...wiring} type="time" value={line.time} onChange={(event) => set({ time: event.target.value })} />}
      </Field>
      <Field label={countTexts.plants} id={plantsFieldId(line.countId)} error={errors.get('plants')}>
        {(wiring) => <NumberInput {...wiring} inputMode="numeric" value={line.plants} onChange={(event) => set({ plants: event.target.value })} />}
      </Field>
      <Field label={countTexts.doubtful} id={idOf('doubtful')} error={errors.get('doubtful')}>
        {(wiring) => <NumberInput {...wiring} inputMode="numeric" value={line.doubtful} onChange={(event) => set({ doubtful: event.target.value })} />}
      </Field>
      <Field label={countTexts.marker} id={idOf('marker')} error={markerError}>
        {(wiring) => <TextInput {...wiring} maxLength={20} value={line.marker} onChange={(event) => set({ marker: event.target.value })} />}
      </Field>
      <Field label={countTexts.countedAs} id={idOf('counted-as')} error={errors.get('countedAs')}>
        {(wiring) => (
          <Select {...wiring} options={kindOptions} value={line.countedAs} onChange={(event) => set({ countedAs: event.target.value as CountKind })} />
        )}
      </Field>
      {onRemove ? (
        <div className="col-span-2 flex justify-end md:col-span-1 md:pt-7">
          <Button look="quiet" aria-label={countTexts.removeLineOf(String(number))} onClick={onRemove}>
            {countTexts.removeLine}
          </Button>
        </div>
      ) : null}
    </div>
  );
}
