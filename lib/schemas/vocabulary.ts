/**
 * The closed lists of words that the database, the schemas, the access table and the screens share.
 * Each list stands once; a check in SQL, a zod enumeration and a select on a screen are made from it.
 */
export const roles = ['owner', 'agronomist', 'scout', 'grower'] as const;
export type Role = (typeof roles)[number];

export const unitSystems = ['us', 'metric'] as const;
export type UnitSystem = (typeof unitSystems)[number];

export const crops = ['corn', 'soybean', 'sorghum', 'sunflower', 'cotton', 'other'] as const;
export type Crop = (typeof crops)[number];

export const tillages = ['no-till', 'strip-till', 'reduced', 'conventional'] as const;
export type Tillage = (typeof tillages)[number];

export const cleanerKinds = ['none', 'fixed', 'floating'] as const;
export type CleanerKind = (typeof cleanerKinds)[number];

export const wheelKinds = ['smooth', 'toothed'] as const;
export type WheelKind = (typeof wheelKinds)[number];

export const pressureDirections = ['own-weight', 'down', 'lift'] as const;
export type PressureDirection = (typeof pressureDirections)[number];

export const adjustedFromPlaces = ['cab', 'wrench'] as const;
export type AdjustedFrom = (typeof adjustedFromPlaces)[number];

export const layoutKinds = ['complete-blocks', 'pairs'] as const;
export type LayoutKind = (typeof layoutKinds)[number];

export const comparisonRules = ['tukey', 'holm'] as const;
export type ComparisonRule = (typeof comparisonRules)[number];

/** The figures that a trial may name, before planting, as the one its headline will speak of. */
export const mainFigures = [
  'spread-days',
  'half-up-days',
  'plants-per-acre',
  'late-share',
  'spacing-sd',
  'score',
] as const;
export type MainFigure = (typeof mainFigures)[number];

export const rowEnds = ['mark', 'plant'] as const;
export type RowEnd = (typeof rowEnds)[number];

export const countKinds = ['so-far', 'new'] as const;
export type CountKind = (typeof countKinds)[number];

export const tapeEntryKinds = ['plant', 'late', 'double', 'missing'] as const;
export type TapeEntryKind = (typeof tapeEntryKinds)[number];

export const tapeUnits = ['in', 'ft-in', 'ft-tenths', 'cm'] as const;
export type TapeUnit = (typeof tapeUnits)[number];

/** From which end of the row the tape was read, and whether its zero lay at the mark or at the first plant. */
export const tapeReadFroms = ['start', 'far-end'] as const;
export type TapeReadFrom = (typeof tapeReadFroms)[number];

export const tapeZeros = ['mark', 'plant'] as const;
export type TapeZero = (typeof tapeZeros)[number];

export const depthUnits = ['in', 'cm'] as const;
export type DepthUnit = (typeof depthUnits)[number];

/** What was dug up: a late plant and its on-time neighbor make a pair, or the place where a plant is missing. */
export const digPlants = ['late', 'neighbor', 'missing'] as const;
export type DigPlant = (typeof digPlants)[number];

/** Digging destroys the sample, so it is done after counting has ended or in the same length beyond the end mark. */
export const digPlaces = ['in-sample', 'twin-length'] as const;
export type DigPlace = (typeof digPlaces)[number];

export const digResidues = ['none', 'beside-seed', 'pinned', 'over-row'] as const;
export type DigResidue = (typeof digResidues)[number];

export const soilMoistures = ['dry', 'moist', 'wet'] as const;
export type SoilMoisture = (typeof soilMoistures)[number];

export const crustThicknesses = ['none', 'thin', 'thick'] as const;
export type CrustThickness = (typeof crustThicknesses)[number];

export const digFindings = [
  'no-seed', 'firm-seed', 'swollen-seed', 'rotted', 'twisted-shoot', 'hollow-or-cut', 'burned-tips', 'residue-in-furrow', 'sound',
] as const;
export type DigFinding = (typeof digFindings)[number];

export const growthStages = ['VE', 'V1', 'V2', 'V3', 'V4', 'V5', 'V6', 'V7', 'V8', 'V9', 'V10'] as const;
export type GrowthStage = (typeof growthStages)[number];

export const temperatureUnits = ['F', 'C'] as const;
export type TemperatureUnit = (typeof temperatureUnits)[number];

export const markerEvents = ['set', 'taken-up'] as const;
export type MarkerEvent = (typeof markerEvents)[number];

/** Where a record came from, so that an import can be told from what was typed, and undone. */
export const originKinds = ['form', 'phone', 'import', 'demo'] as const;
export type OriginKind = (typeof originKinds)[number];

export const importKinds = ['counts', 'tape-sheets'] as const;
export type ImportKind = (typeof importKinds)[number];

export const withdrawableKinds = [
  'count', 'tape-sheet', 'residue-reading', 'import',
  'depth-reading', 'dig', 'crust-reading', 'field-transect', 'condition', 'note', 'marker-tally', 'entry-restriction', 'entry-exception',
  'photo',
] as const;
export type WithdrawableKind = (typeof withdrawableKinds)[number];

export const decisionChoices = ['keep', 'replant'] as const;
export type DecisionChoice = (typeof decisionChoices)[number];

export const linkPurposes = ['first-owner', 'invitation', 'password-reset'] as const;
export type LinkPurpose = (typeof linkPurposes)[number];

/** Units a reading may be typed in; the canonical whole number is in thousandths of this same unit. */
export const readingUnits = [
  'in', 'ft', 'cm', 'm', 'mm',
  'acres', 'ha',
  'per-acre', 'per-ha',
  'percent',
  'bu/ac', 't/ha',
  'lb', 'kg', 'lbf', 'psi', 'kPa', 'N',
] as const;
export type ReadingUnit = (typeof readingUnits)[number];
