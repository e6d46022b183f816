import type { CrustThickness, DigPlace, DigResidue, MarkerEvent, SoilMoisture } from '../schemas/vocabulary';

/** The words of what is recorded in the field beside counts: on a row sample's page and on a planting's. */
export const fieldRecordTexts = {
  section: 'Also recorded here',
  sectionLead: 'From the phone. The figures on this page do not change with it.',
  plantingSection: 'Also recorded in this planting',
  plantingSectionLead: 'From the phone. What belongs to one row sample stands on its sheet.',
  on: (date: string, day: string) => `${date}, day ${day}`,
  by: (name: string) => `by ${name}`,

  depths: 'Seeding depth',
  depthMean: (mean: string, shallowest: string, deepest: string, plants: string) => `${mean} on average, ${shallowest} to ${deepest}; ${plants}`,
  depthsTyped: (typed: string) => `As read: ${typed}`,
  depthOf: (date: string) => `the seeding depths of ${date}`,

  digs: 'Dug up',
  digWhere: { 'in-sample': 'in the measured length', 'twin-length': 'in the twin length' } satisfies Record<DigPlace, string>,
  place: 'Place on the tape',
  depth: 'Seeding depth',
  residue: 'Residue at the seed',
  residues: { none: 'none', 'beside-seed': 'beside the seed', pinned: 'pinned in the furrow', 'over-row': 'over the row' } satisfies Record<DigResidue, string>,
  moisture: 'Soil at the seed',
  moistures: { dry: 'dry', moist: 'moist', wet: 'wet' } satisfies Record<SoilMoisture, string>,
  crust: 'Crust',
  crusts: { none: 'none', thin: 'thin', thick: 'thick' } satisfies Record<CrustThickness, string>,
  found: 'Found',
  pointsTo: 'Points to',
  keySuggests: 'A key suggests, it does not decide; several causes can act at once.',
  note: 'Note',
  notLooked: 'not noted',
  digOf: (plant: string, date: string) => `the dig of ${date}, ${plant}`,

  crustSection: 'Below the crust',
  sprouts: (sound: string, dead: string) => `${sound}, ${dead} dead`,
  crustIs: (crust: string) => `crust ${crust}`,
  noCrust: 'no crust',
  crustOf: (date: string) => `the sprouts counted on ${date}`,

  markers: 'Markers',
  events: { set: 'set', 'taken-up': 'taken up' } satisfies Record<MarkerEvent, string>,
  markersLeft: (markers: string, verb: string) => `${markers} ${verb} still out here. Take up before the next machine.`,
  markersAllUp: 'All that were set are taken up.',
  markerOf: (event: string, date: string) => `the markers ${event} on ${date}`,
  markersOut: (markers: string, verb: string, rows: string) => `${markers} ${verb} still out, in ${rows}. Take up before the next machine.`,
  markersOutOf: (markers: string) => `${markers} out`,

  conditions: 'Growth stage and soil',
  stage: (stage: string) => `stage ${stage}`,
  soilTemperature: (temperature: string) => `soil ${temperature}`,
  soilMoisture: (moisture: string) => `soil ${moisture}`,
  conditionOf: (date: string) => `growth stage and soil of ${date}`,

  notes: 'Notes',
  noteOf: (date: string) => `the note of ${date}`,

  transects: 'Field cover by transect',
  transectMean: (percent: string, transects: string) => `${percent} of the ground covered, over ${transects}`,
  transectsFew: 'Read at least three places before this says anything of the field.',
  transectSpread: (least: string, most: string) => `Single transects run from ${least} to ${most}.`,
  transect: (covered: string, read: string, percent: string) => `${covered} of ${read} marks on residue, ${percent}`,
  inStrip: (number: string) => `strip ${number}`,
  transectOf: (date: string) => `the transect of ${date}`,
} as const;
