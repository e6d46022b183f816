import { countText } from '@/lib/format/count-text';

export const crustTexts = {
  title: 'Below the crust',
  how: 'Lift the soil over the row where plants are missing and look at every sprout. Do it beyond the end mark while the row is still counted.',
  sound: 'Sound sprouts',
  dead: 'Dead or twisted sprouts',
  crust: 'Crust',
  none: 'none',
  thin: 'thin, breaks in the hand',
  thick: 'thick and hard',
  keep: 'Keep',
  says: {
    hoe: (sound: number) => `${countText(sound, 'sound sprout')} under a crust: a rotary hoe may let them through. Try a few yards first and look behind it; it takes some plants along.`,
    wait: (sound: number) => `${countText(sound, 'sound sprout')} and no crust: they come by themselves. Look again in 3 to 5 days before anybody decides.`,
    decide: 'No sound sprout: nothing more is to come from below here.',
  },
  typeNumber: (what: string) => `Type ${what} as a whole number, zero where there are none.`,
  chooseCrust: 'Choose how thick the crust is.',
} as const;
