'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { countText } from '@/lib/format/count-text';
import { importTexts } from '@/lib/texts/import-texts';

const shownAtFirst = 20;

/** Everything that is wrong with a file, line by line. */
export function ImportProblems({ problems }: { problems: readonly string[] }) {
  const [all, setAll] = useState(false);
  if (problems.length === 0) return null;
  const shown = all ? problems : problems.slice(0, shownAtFirst);
  return (
    <div role="alert" className="border-l-8 border-flag py-2 pl-4">
      <p className="text-18 font-bold text-flag-text">{importTexts.problems(countText(problems.length, 'place'))}</p>
      <ol className="mt-2 flex flex-col gap-1">
        {shown.map((problem, index) => (
          <li key={index}>{problem}</li>
        ))}
      </ol>
      {shown.length < problems.length ? (
        <Button look="quiet" onClick={() => setAll(true)}>
          {importTexts.more(countText(problems.length, 'place'))}
        </Button>
      ) : null}
    </div>
  );
}
