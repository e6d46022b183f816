export const conditionTexts = {
  title: 'Growth stage and soil',
  how: 'What stands here today. One of the three is enough.',
  stage: 'Growth stage, by leaf collars',
  temperature: 'Soil temperature at seeding depth',
  unit: 'Unit',
  fahrenheit: '°F',
  celsius: '°C',
  moisture: 'Soil at seeding depth',
  needOne: 'Give the growth stage, the soil temperature or the soil moisture.',
} as const;

export const noteTexts = {
  title: 'Note',
  text: 'What is to be known here',
  needText: 'Write the note.',
  before: 'Notes so far',
} as const;
