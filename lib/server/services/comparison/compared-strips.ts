import { mapOutcome, type Outcome } from '@/lib/agronomy/outcome';
import { poolScores, type PoolScores } from '@/lib/agronomy/pool-scores';
import type { RowSample } from '@/lib/agronomy/row-sample';
import type { ComparedFigure } from '@/lib/schemas/comparison';
import type { ListedStrip } from '../../data/strip';
import type { CoreSamples } from '../scores/core-samples';
import { settingOfStrip } from '../scores/setting-of-strip';
import { inRowCover } from './in-row-cover';

export type ComparedStrip = {
  strip: ListedStrip;
  settingId: string;
  samples: RowSample[];
  pool: PoolScores;
  cover: Outcome<number>;
};

export type StripAnswer = Outcome<{ figure: number; isBound: boolean }>;

/** The strips that count, each with its row samples taken together: the strip is the unit of every comparison. */
export function comparedStrips(core: CoreSamples, samples: readonly RowSample[]): ComparedStrip[] {
  return core.strips.flatMap((strip): ComparedStrip[] => {
    const { settingId } = settingOfStrip(strip);
    if (settingId === null) return [];
    const own = samples.filter((sample) => sample.stripId === strip.id);
    const rowSampleIds = core.rowSamples.filter((row) => row.stripId === strip.id).map((row) => row.id);
    const cover = inRowCover(core.observations.residueReadings, rowSampleIds);
    return [{ strip, settingId, samples: own, pool: poolScores(own), cover }];
  });
}

const exact = (figure: number) => ({ figure, isBound: false });

/** The one value of a strip that a figure is compared by, and whether it is only a bound while plants still come. */
export function stripAnswer({ pool: { figures }, cover }: ComparedStrip, figure: ComparedFigure): StripAnswer {
  switch (figure) {
    case 'spread-days':
      return mapOutcome(figures.spreadDays, ({ days, bound }) => ({ figure: days, isBound: bound !== 'exact' }));
    case 'half-up-days':
      return mapOutcome(figures.daysTo50, ({ days, bound }) => ({ figure: days, isBound: bound !== 'exact' }));
    case 'plants-per-acre':
      return mapOutcome(figures.plantsPerAcre, ({ plantsPerAcre }) => exact(plantsPerAcre));
    case 'late-share':
      return mapOutcome(figures.lateShare, ({ share, bound }) => ({ figure: share, isBound: bound !== 'exact' }));
    case 'spacing-sd':
      return mapOutcome(figures.spacingInchesSd, exact);
    case 'score':
      return mapOutcome(figures.score, ({ points, bound }) => ({ figure: points, isBound: bound !== 'exact' }));
    case 'share-of-seed':
      return mapOutcome(figures.shareOfSeed, ({ share }) => exact(share));
    case 'spacing-cv':
      return mapOutcome(figures.spacingCv, exact);
    case 'in-row-cover':
      return mapOutcome(cover, exact);
  }
}
