import type { CrustThickness, DigFinding, DigPlant, DigResidue, SoilMoisture } from '@/lib/schemas/vocabulary';

const plants: Record<DigPlant, string> = { late: 'A late plant', neighbor: 'Its on-time neighbor', missing: 'Where one is missing' };
const residues: Record<DigResidue, string> = { none: 'none', 'beside-seed': 'beside the seed', pinned: 'pinned in the furrow', 'over-row': 'over the row' };
const moistures: Record<SoilMoisture, string> = { dry: 'dry', moist: 'moist', wet: 'wet' };
const crusts: Record<CrustThickness, string> = { none: 'none', thin: 'thin', thick: 'thick' };

/** What a dig finds and what it points to: extension keys of Iowa State, Ohio State and Wisconsin; a key suggests, it does not decide. */
const findings: Record<DigFinding, { found: string; pointsTo: string }> = {
  'no-seed': { found: 'No seed', pointsTo: 'the planter (meter, tube, empty box), or birds or rodents, which leave traces' },
  'firm-seed': { found: 'Seed firm, not germinated', pointsTo: 'dead seed, too dry, soil under 50 °F, or fertilizer against the seed' },
  'swollen-seed': { found: 'Seed swollen, not sprouted', pointsTo: 'poor contact with the soil, shallow and then dried, too wet or too cold' },
  rotted: { found: 'Soft, brown, white to pink mold', pointsTo: 'long cool and wet: seed rots and seedling blights' },
  'twisted-shoot': { found: 'Shoot twisted or leafed out below ground', pointsTo: 'crust, compaction, clods that let light in, too deep, or a herbicide under cool wet conditions' },
  'hollow-or-cut': { found: 'Kernel hollow, or shoot cut', pointsTo: 'seedcorn maggot, wireworm or cutworm' },
  'burned-tips': { found: 'Root and shoot tips brown or black, seed firm', pointsTo: 'fertilizer salt or ammonia' },
  'residue-in-furrow': { found: 'Residue pinned in the furrow beside the seed', pointsTo: 'residue not moved from the row: wetter or drier, cooler, a home for blight (common practice, no source)' },
  sound: { found: 'Sound, nothing wrong seen', pointsTo: 'time, or the depth of the seed' },
};

export const digTexts = {
  title: 'Dig',
  notYet: 'Counting of this row has not ended. Digging destroys the sample: dig in the twin length beyond the end mark, or wait until two visits find nothing new.',
  ended: 'Counting of this row has ended.',
  where: 'Where is it dug?',
  places: { 'in-sample': 'in the measured length', 'twin-length': 'in the twin length, beyond the end mark' },
  plant: 'What is dug?',
  plants,
  place: 'Place on the tape',
  depth: 'Depth of the seed',
  unit: 'in',
  residue: 'Residue at the seed',
  residues,
  moisture: 'Soil at the seed',
  moistures,
  crust: 'Crust above it',
  crusts,
  found: 'What was found',
  findings,
  pointsTo: 'Points to',
  suggests: 'A key suggests, it does not decide; several causes can act at once.',
  note: 'Note',
  keepLate: 'Keep, then its neighbor',
  keep: 'Keep',
  keepAlone: 'Keep without a neighbor',
  neighborNext: 'Now its on-time neighbor: the same looked at side by side tells most.',
  before: 'Dug here so far',
  optional: 'may stay empty',
} as const;
