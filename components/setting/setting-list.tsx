'use client';

import { OpeningForm } from '@/components/form/opening-form';
import { RemoveThing } from '@/components/form/remove-thing';
import { countText } from '@/lib/format/count-text';
import { readingText } from '@/lib/format/reading-text';
import { formTexts } from '@/lib/texts/form-texts';
import { settingTexts } from '@/lib/texts/setting-texts';
import { SettingForm } from './setting-form';
import type { SettingFacts } from './setting-draft';

type SettingListProps = { settings: readonly (SettingFacts & { trials: number })[]; mayWrite: boolean };

/** The account's settings, each with what it is and where it is compared. */
export function SettingList({ settings, mayWrite }: SettingListProps) {
  return (
    <ul className="flex flex-col">
      {settings.map((setting) => (
        <li key={setting.id} className="flex flex-col gap-1 border-b border-rule py-3 first:border-t">
          <p className="text-18 font-bold">{setting.name}</p>
          <p className="text-15">{settingLine(setting)}</p>
          {setting.note ? <p className="text-15 text-ink-soft">{setting.note}</p> : null}
          {setting.trials > 0 ? <p className="text-13 text-ink-soft">{settingTexts.trials(countText(setting.trials, 'trial'))}</p> : null}
          {mayWrite ? (
            <div className="flex flex-wrap gap-x-3">
              <OpeningForm
                label={formTexts.change}
                accessibleLabel={settingTexts.change(setting.name)}
                look="quiet"
                form={(close) => <SettingForm setting={setting} onDone={close} />}
              />
              <RemoveThing
                noun="settings"
                kind="setting.remove"
                thing={setting}
                label={settingTexts.remove(setting.name)}
                explanation={settingTexts.removeExplanation}
              />
            </div>
          ) : null}
        </li>
      ))}
    </ul>
  );
}

function settingLine(setting: SettingFacts): string {
  const { cleaner, wheels, pressureDirection, pressure, workingDepth, adjustedFrom } = setting;
  return [
    `${settingTexts.cleaner}: ${settingTexts.cleaners[cleaner].toLowerCase()}`,
    wheels ? `${settingTexts.wheels.toLowerCase()} ${settingTexts.wheelKinds[wheels].toLowerCase()}` : null,
    pressureDirection
      ? `${settingTexts.directions[pressureDirection].toLowerCase()}${pressure ? ` ${readingText(pressure)}` : ''}`
      : null,
    workingDepth ? `${settingTexts.workingDepth.toLowerCase()} ${readingText(workingDepth)}` : null,
    adjustedFrom ? `${settingTexts.adjustedFrom.toLowerCase()} ${settingTexts.places[adjustedFrom].toLowerCase()}` : null,
  ]
    .filter((part) => part !== null)
    .join(', ');
}
