/** The limits of what is recorded in the field, as plain numbers: shared by schemas, tables, services and the phone's own checks. */
export const plantsMost = 2_000;
export const tapePlacesMost = 1_000;
export const leafCollarsMost = 20;
export const marksMost = 1_000;

export const depthsMost = 30;
export const depthInchesMost = 6;

export const digPlaceCharactersMost = 30;
export const digNoteCharactersMost = 500;

export const sproutsMost = 2_000;
export const markersMost = 2_000;
export const noteCharactersMost = 1_000;

/** Soil is read from frozen to far hotter than any seed stands. */
export const soilFahrenheitLeast = 0;
export const soilFahrenheitMost = 150;
export const soilCelsiusLeast = -18;
export const soilCelsiusMost = 66;

export const productCharactersMost = 80;
export const restrictionHoursMost = 2_000;
export const exceptionCharactersMost = 200;
export const equipmentCharactersMost = 200;

export const labelCharactersMost = 20;

export const photoBytesMost = 8 * 1024 * 1024;
export const photoAccuracyMetersMost = 100_000;
