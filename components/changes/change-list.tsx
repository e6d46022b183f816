import { Disclosure } from '@/components/ui/disclosure';
import { instantText } from '@/lib/format/instant-text';
import { changeTexts } from '@/lib/texts/change-texts';

type Change = { id: string; kind: string; body: unknown; at: string; personName: string; readInByName?: string | null };

/** Each change as who did what when; what was sent opens below it as it came. */
export function ChangeList({ changes, timeZone }: { changes: readonly Change[]; timeZone: string }) {
  return (
    <ul>
      {changes.map((change) => (
        <li key={change.id} className="border-b border-rule py-2">
          <p>
            <span className="font-mono text-13">{instantText(change.at, timeZone)}</span>{' '}
            <span className="font-bold">{change.personName}</span> {changeTexts.kinds[change.kind] ?? change.kind}
            {change.readInByName ? `, ${changeTexts.readInBy(change.readInByName)}` : ''}
          </p>
          <Disclosure label={changeTexts.content}>
            <pre className="overflow-x-auto text-13 whitespace-pre-wrap break-words">{JSON.stringify(change.body, null, 2)}</pre>
          </Disclosure>
        </li>
      ))}
    </ul>
  );
}
