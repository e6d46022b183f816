import { layout } from '@/lib/agronomy/layout';
import { layoutSeed } from './chosen-seeds';
import { demoId } from './demo-id';
import { settingIdOf } from './demo-settings';
import type { SimulatedRow, SimulatedStrip } from './simulate-trial';
import { trialPlan, trialTruth } from './trial-truth';

export type LaidRow = { id: string; label: string; planterRow: number; simulated: SimulatedRow };
export type LaidStrip = { id: string; number: number; settingId: string; simulated: SimulatedStrip; rows: LaidRow[] };
export type LaidBlock = { id: string; number: number; strips: LaidStrip[] };

/** The same planter rows are sampled in every strip, away from wheel tracks and end units. */
const planterRows = [3, 6, 10];

/** The simulated strips where the drawn layout puts them, each with the ids and pegs of its row samples. */
export function trialLayout(simulated: readonly SimulatedStrip[]): LaidBlock[] {
  const drawn = layout({ settings: trialTruth.map(({ key }) => settingIdOf(key)), blocks: trialPlan.blocks, seed: layoutSeed });
  return drawn.blocks.map((block) => ({
    id: demoId(`quillfern/block/${block.blockNumber}`),
    number: block.blockNumber,
    strips: block.strips.map(({ stripNumber, setting }): LaidStrip => {
      const strip = simulated.find((each) => each.blockNumber === block.blockNumber && settingIdOf(each.setting) === setting);
      if (!strip) throw new Error(`Nothing was simulated for strip ${stripNumber}.`);
      const rows = strip.rows.map((row, index) => ({
        id: demoId(`quillfern/row/${stripNumber}-${index + 1}`),
        label: `S${stripNumber}-${index + 1}`,
        planterRow: planterRows[index] ?? index + 1,
        simulated: row,
      }));
      return { id: demoId(`quillfern/strip/${stripNumber}`), number: stripNumber, settingId: setting, simulated: strip, rows };
    }),
  }));
}
