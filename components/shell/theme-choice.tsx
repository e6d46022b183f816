'use client';

import { useId, useSyncExternalStore } from 'react';
import { Select } from '@/components/ui/select';
import { interfaceTexts } from '@/lib/texts/interface-texts';

// public/theme.js reads the same key before the first paint and listens for the same event.
const storageKey = 'rowrise-theme';
const changeEvent = 'rowrise-theme';

function subscribe(onChange: () => void): () => void {
  window.addEventListener(changeEvent, onChange);
  window.addEventListener('storage', onChange);
  return () => {
    window.removeEventListener(changeEvent, onChange);
    window.removeEventListener('storage', onChange);
  };
}

function storedChoice(): string {
  try {
    return window.localStorage.getItem(storageKey) ?? 'light';
  } catch {
    return 'light';
  }
}

/** Light for the sun, dark for the cab at night, or as the device is set; kept in this browser. */
export function ThemeChoice() {
  const id = useId();
  const choice = useSyncExternalStore(subscribe, storedChoice, () => 'light');
  const texts = interfaceTexts.shell;
  return (
    <div className="flex items-center gap-3">
      <label htmlFor={id} className="text-13">
        {texts.themeChoice}
      </label>
      <Select
        id={id}
        value={choice}
        onChange={(event) => {
          try {
            window.localStorage.setItem(storageKey, event.target.value);
          } catch {
            // Without storage there is nothing to keep the choice in; the light theme stays.
          }
          window.dispatchEvent(new Event(changeEvent));
        }}
        options={[
          { value: 'light', label: texts.themeLight },
          { value: 'dark', label: texts.themeDark },
          { value: 'auto', label: texts.themeAuto },
        ]}
      />
    </div>
  );
}
