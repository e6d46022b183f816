import { bySegment } from './by-segment';
import { doublesAndGaps } from './doubles-and-gaps';
import type { Figures } from './figures';
import { kachmanSmith } from './kachman-smith';
import { missingPlantsSdInches } from './missing-plants-sd';
import { chainOutcome, insufficient, mapOutcome, value, type Outcome } from './outcome';
import type { RowSample } from './row-sample';
import { spacingInchesMean, spacingsInches, spacingVariation } from './spacing';
import { theoreticalSpacingInches } from './theoretical-spacing';

export type SpacingFigures = Pick<
  Figures,
  | 'spacingInchesMean'
  | 'spacingInchesSd'
  | 'spacingCv'
  | 'theoreticalSpacingInches'
  | 'placement'
  | 'spacingInchesSdSingles'
  | 'spacingInchesSdFromMissing'
  | 'doublesAndGaps'
>;

/**
 * What do the tape sheets of one or more row samples say about spacing?
 *
 * Takes row samples and the share of seeds standing in them (or insufficient). Returns the spacing figures, the
 * spacings of all sheets joined without bridging rows or cuts. Each is insufficient where its own needs are not met.
 * Throws ImpossibleInput as its parts do. Method: as each part states; the theoretical spacing shown is the
 * mean over the row samples with a tape sheet. It does not tell planter and emergence apart.
 * Example: places 0 2 17 33 38 39 44 52 55 60 68 in: mean 6.8, SD 5.116 in.
 */
export function spacingFigures(
  samples: readonly RowSample[],
  shareStanding: Outcome<number>,
): SpacingFigures {
  const sheets = samples.filter((sample) => sample.tape !== null);
  const rows = sheets.map((sample) => ({ sample, spacings: plantSpacingsInches(sample) }));
  const spacings = rows.flatMap((row) => row.spacings);
  const none = sheets.length === 0 ? insufficient('no-tape-sheet', '1 tape sheet', 'no tape sheet') : null;
  const theoretical = meanTheoretical(sheets.length > 0 ? sheets : samples);
  const variation = none ?? spacingVariation(spacings);
  const placement =
    none ??
    chainOutcome(theoretical, () =>
      kachmanSmith(
        rows.map(({ sample, spacings: own }) => ({
          spacingsInches: own,
          theoreticalSpacingInches: theoreticalSpacingInches(
            sample.seedsPerAcre as number,
            sample.rowSpacingInches,
          ),
        })),
      ),
    );
  return {
    spacingInchesMean: none ?? spacingInchesMean(spacings),
    spacingInchesSd: mapOutcome(variation, (spread) => spread.spacingInchesSd),
    spacingCv: chainOutcome(variation, (spread) => spread.spacingCv),
    theoreticalSpacingInches: theoretical,
    placement,
    spacingInchesSdSingles: chainOutcome(placement, ({ precision }) =>
      chainOutcome(precision, (ratio) => mapOutcome(theoretical, (spacing) => ratio * spacing)),
    ),
    spacingInchesSdFromMissing: chainOutcome(theoretical, (spacing) =>
      chainOutcome(shareStanding, (share) => missingPlantsSdInches(spacing, share)),
    ),
    doublesAndGaps: none ?? doublesAndGaps(spacings),
  };
}

/** The spacings between the plants of one sheet, missing places left out; a cut between two pieces of the tape is never bridged. */
export function plantSpacingsInches(sample: RowSample): number[] {
  const plants = (sample.tape ?? []).filter((place) => place.kind !== 'missing');
  return bySegment(plants, (plant) => plant.segment).flatMap((piece) =>
    spacingsInches(piece.map((plant) => plant.positionInches)),
  );
}

function meanTheoretical(samples: readonly RowSample[]): Outcome<number> {
  const theoretical = samples.flatMap((sample) =>
    sample.seedsPerAcre === null
      ? []
      : [theoreticalSpacingInches(sample.seedsPerAcre, sample.rowSpacingInches)],
  );
  if (samples.length === 0 || theoretical.length < samples.length) {
    return insufficient('seeds-not-known', 'seeds per acre', 'no seeding rate');
  }
  return value(theoretical.reduce((sum, spacing) => sum + spacing, 0) / theoretical.length);
}
