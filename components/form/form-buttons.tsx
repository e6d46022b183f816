import { Button } from '@/components/ui/button';
import { formTexts } from '@/lib/texts/form-texts';

type FormButtonsProps = { label: string; pending: boolean; onCancel?: (() => void) | undefined };

/** The press that saves, and the one that leaves things as they were. */
export function FormButtons({ label, pending, onCancel }: FormButtonsProps) {
  return (
    <div className="flex flex-wrap gap-2">
      <Button type="submit" pending={pending} pendingText={formTexts.saving}>
        {label}
      </Button>
      {onCancel ? (
        <Button look="secondary" onClick={onCancel}>
          {formTexts.cancel}
        </Button>
      ) : null}
    </div>
  );
}
