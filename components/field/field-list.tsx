import Link from 'next/link';
import { dateText } from '@/lib/format/date-text';
import { readingText } from '@/lib/format/reading-text';
import { paths } from '@/lib/paths/paths';
import type { Crop, ReadingUnit } from '@/lib/schemas/vocabulary';
import { fieldTexts } from '@/lib/texts/field-texts';
import { plantingTexts } from '@/lib/texts/planting-texts';

type FieldListProps = {
  org: string;
  fields: readonly {
    id: string;
    name: string;
    area: { typed: string; unit: ReadingUnit } | null;
    newest: { crop: Crop; plantedOn: string } | null;
  }[];
};

/** The fields of a farm, each with its area and what was last planted in it. */
export function FieldList({ org, fields }: FieldListProps) {
  return (
    <ul className="flex flex-col">
      {fields.map((field) => (
        <li key={field.id} className="border-b border-rule first:border-t">
          <Link href={paths.field(org, field.id)} className="flex min-h-press flex-wrap items-baseline gap-x-4 py-3 hover:bg-bone">
            <span className="text-18 font-bold underline underline-offset-4">{field.name}</span>
            <span className="font-mono">{field.area ? readingText(field.area) : fieldTexts.areaMissing}</span>
            <span className="text-ink-soft">
              {field.newest
                ? fieldTexts.newest(plantingTexts.crop[field.newest.crop], dateText(field.newest.plantedOn))
                : fieldTexts.noPlantingYet}
            </span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
