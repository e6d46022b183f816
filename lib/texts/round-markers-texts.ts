import { countText } from '@/lib/format/count-text';

export const markersTexts = {
  title: 'Markers out',
  how: 'Every marker that was set comes out again before the next machine.',
  left: (markers: number) => (markers === 0 ? 'Every marker is out.' : `${countText(markers, 'marker')} still in the field.`),
  set: 'set',
  out: 'out',
  setLabel: (label: string) => `${label}, markers set`,
  outLabel: (label: string) => `${label}, markers taken up`,
  suggested: (markers: number) => `${markers} by the counts`,
  keepRow: 'Keep',
  keptRow: 'kept',
  needNumber: 'Type whole numbers, zero where there are none.',
} as const;
