export const roundPhotoTexts = {
  title: 'Photos',
  take: 'Take a photo',
  making: 'Making it smaller',
  hint: 'It is made smaller here, kept on this phone, and sent when there is a network.',
  failed: 'This picture could not be read. Take a JPEG, PNG or WebP picture.',
  kept: (time: string | null, place: boolean) => [`kept${time ? `, ${time}` : ''}`, place ? 'with its place' : 'without a place'].join(', '),
  needsLook: 'needs a look',
  none: 'No photo of this row waits on this phone.',
  alt: (label: string, time: string | null) => `Photo at ${label}${time ? `, ${time}` : ''}`,
} as const;
