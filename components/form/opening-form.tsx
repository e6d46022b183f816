'use client';

import { useState, type ReactNode } from 'react';
import { Button } from '@/components/ui/button';

type OpeningFormProps = {
  /** The button that opens it: "Change the planting". */
  label: string;
  /** Read out where several such buttons stand on a page. */
  accessibleLabel?: string;
  look?: 'secondary' | 'quiet' | 'primary';
  /** Shown while the form is closed. */
  children?: ReactNode;
  form: (close: () => void) => ReactNode;
};

/** A form that opens in its place. It is made when it opens, so that it always begins with what stands then. */
export function OpeningForm({ label, accessibleLabel, look = 'secondary', children, form }: OpeningFormProps) {
  const [open, setOpen] = useState(false);
  if (open) return <>{form(() => setOpen(false))}</>;
  return (
    <>
      {children}
      <div>
        <Button look={look} aria-label={accessibleLabel} onClick={() => setOpen(true)}>
          {label}
        </Button>
      </div>
    </>
  );
}
