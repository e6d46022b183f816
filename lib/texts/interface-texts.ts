/** The words that every screen shares: of the product, the controls, the shell, the tape and the charts. */
export const interfaceTexts = {
  product: {
    name: 'Rowrise',
    description: 'How well and how evenly a row crop came up, and what to do about it.',
  },
  controls: {
    close: 'Close',
    choose: 'Choose one',
    downloadCsv: 'Download CSV',
    filter: 'Show only rows with',
    rowsShown: (shown: number, all: number) => `${shown} of ${all} rows`,
    noRowMatches: 'No row has these words.',
    sortBy: (column: string) => `Sort by ${column}`,
    scrollsSideways: 'scrolls sideways',
    openNumber: (label: string, text: string) => `${label}: ${text}. Show where it comes from`,
    inputs: 'From',
    formula: 'Formula',
    source: 'Source',
    limits: 'What it does not tell',
    optional: 'may stay empty',
    working: 'Working',
  },
  shell: {
    skipToContent: 'Skip to the content',
    primaryNavigation: 'Main pages',
    seasonNavigation: 'The season of this planting',
    themeChoice: 'Screen',
    themeLight: 'Light',
    themeDark: 'Dark, for the cab at night',
    themeAuto: 'As this device is set',
  },
  tape: {
    legend:
      'Height is how early the plant came up. An open head is a late plant, a cross is a seed that never came, a bracket is a double.',
    gap: (length: string) => `gap ${length}`,
    double: 'double',
    summary: (parts: { plants: number; late: number; doubles: number; missing: number; length: string }) =>
      `${parts.plants} ${parts.plants === 1 ? 'plant' : 'plants'} in ${parts.length} of row, of which ${parts.late} late; ${parts.doubles} ${parts.doubles === 1 ? 'double' : 'doubles'}; ${parts.missing} ${parts.missing === 1 ? 'seed' : 'seeds'} never came.`,
    endAtMark: 'mark',
    endAtPlant: 'plant',
  },
  charts: {
    numbersBehind: 'The numbers behind this picture',
    daysAfterPlanting: 'days after planting',
    day: 'Day',
    difference: 'Difference',
    interval: '95 % interval',
    seedsPlanted: (seeds: string) => `${seeds} seeds planted`,
    better: (direction: 'fewer' | 'more') => (direction === 'fewer' ? 'lower is better' : 'higher is better'),
    noDifference: 'no difference',
  },
} as const;
