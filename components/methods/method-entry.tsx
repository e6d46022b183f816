import { Disclosure } from '@/components/ui/disclosure';
import type { RegisterEntry } from '@/lib/agronomy/register/register-entry';
import { methodTexts } from '@/lib/texts/method-texts';

const texts = methodTexts.entry;

/** One figure: what it says at the left, its equation at the right; where it comes from, its limits and an example are one press away. */
export function MethodEntry({ entry }: { entry: RegisterEntry }) {
  const example = entry.workedExample;
  const facts = [
    { name: texts.source, text: entry.source },
    { name: texts.domain, text: entry.domain },
    { name: texts.limits, text: entry.limits },
  ];
  return (
    <article id={entry.id} className="grid scroll-mt-4 gap-x-10 gap-y-3 border-t border-rule py-5 lg:grid-cols-[20rem_1fr]">
      <div className="flex flex-col gap-1">
        <h3 className="text-18">{entry.name}</h3>
        <p className="text-15">{entry.sentence}</p>
        <p className="font-mono text-13 text-ink-soft">{texts.version(entry.version)}</p>
      </div>
      <div className="flex min-w-0 flex-col gap-1">
        <p className="max-w-reading font-mono text-15">
          <span className="sr-only">{texts.equation}: </span>
          {entry.equation}
        </p>
        <Disclosure label={texts.more}>
          <dl className="flex min-w-0 flex-col gap-3">
            {facts.map((fact) => (
              <div key={fact.name}>
                <dt className="text-13 font-bold">{fact.name}</dt>
                <dd className="max-w-reading text-15">{fact.text}</dd>
              </div>
            ))}
            <div>
              <dt className="text-13 font-bold">{texts.example}</dt>
              <dd className="max-w-reading text-15">
                {example.given} {texts.gives} <strong>{example.result}</strong>
              </dd>
              <dd className="text-13 text-ink-soft">{texts.exampleFrom(example.source)}</dd>
            </div>
          </dl>
        </Disclosure>
      </div>
    </article>
  );
}
