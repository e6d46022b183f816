'use client';

import { v7 } from 'uuid';
import { readingDraft } from '@/components/form/reading-draft';
import { fieldError, fieldIdOf } from '@/components/form/problem-summary';
import { ReadingField } from '@/components/form/reading-field';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/text-input';
import type { ProblemError } from '@/lib/client/problem-error';
import { fieldAreaRule } from '@/lib/schemas/field';
import type { UnitSystem } from '@/lib/schemas/vocabulary';
import { plantingFormTexts } from '@/lib/texts/planting-form-texts';
import type { PlantingDraft } from './planting-draft';

type Zones = PlantingDraft['zones'];
type ZoneFieldsProps = { zones: Zones; units: UnitSystem; onChange: (zones: Zones) => void; error: ProblemError | null };

/** The parts of a planting that are looked at apart, each with its area. */
export function ZoneFields({ zones, units, onChange, error }: ZoneFieldsProps) {
  const change = (index: number, part: Partial<Zones[number]>) =>
    onChange(zones.map((zone, place) => (place === index ? { ...zone, ...part } : zone)));
  return (
    <div className="flex flex-col gap-4">
      {zones.map((zone, index) => (
        <div key={zone.id} className="flex flex-wrap items-end gap-3">
          <Field
            label={plantingFormTexts.zoneName(index + 1)}
            id={fieldIdOf(`zones.${index}.name`)}
            error={fieldError(error, `zones.${index}.name`)}
          >
            {(wiring) => <TextInput {...wiring} value={zone.name} onChange={(event) => change(index, { name: event.target.value })} />}
          </Field>
          <ReadingField
            label={plantingFormTexts.zoneArea(index + 1)}
            path={`zones.${index}.area`}
            value={zone.area}
            onChange={(area) => change(index, { area })}
            error={error}
          />
          <Button look="quiet" onClick={() => onChange(zones.filter((_, place) => place !== index))}>
            {plantingFormTexts.removeZone(index + 1)}
          </Button>
        </div>
      ))}
      <div>
        <Button look="secondary" onClick={() => onChange([...zones, { id: v7(), name: '', area: readingDraft(null, fieldAreaRule, units) }])}>
          {plantingFormTexts.addZone}
        </Button>
      </div>
    </div>
  );
}
