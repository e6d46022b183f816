import { countText } from '@/lib/format/count-text';

export const depthTexts = {
  title: 'Seeding depth',
  how: 'Dig beside a plant that is up and measure the white shank, from the soil surface to the seed.',
  unit: 'Measured in',
  inches: 'inches',
  centimeters: 'centimeters',
  plant: (number: number) => `Plant ${number}`,
  next: 'Next plant',
  back: 'Delete',
  soFar: (count: number, mean: string, least: string, most: string, unit: string) => `${countText(count, 'plant')}: mean ${mean}, from ${least} to ${most} ${unit}`,
  none: 'No depth typed yet',
  keep: (count: number) => (count >= 10 ? `Keep ${count} depths` : `Keep ${count} of 10`),
  needOne: 'Type at least one depth.',
  list: 'Depths typed',
} as const;
