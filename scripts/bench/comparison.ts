// How long the comparison of settings takes: block analysis, Tukey, and the exact randomisation test.
import {
  blockAnalysis,
  type BlockAnalysis,
  type StripFigure,
} from '../../lib/agronomy/inference/block-analysis';
import { tukeyPair } from '../../lib/agronomy/inference/pairwise';
import { randomisationTest } from '../../lib/agronomy/inference/randomisation-test';
import { randomStream } from '../../lib/agronomy/random';
import { median } from './ratio';

const rounds = 31;

const stream = randomStream(20_260_507);

/** Invented figures of complete blocks. */
function trial(settings: number, blocks: number): StripFigure[] {
  return Array.from({ length: blocks * settings }, (_, index) => ({
    block: `${Math.floor(index / settings)}`,
    setting: `${index % settings}`,
    figure: 10 + stream.nextUnit(),
  }));
}

function analysed(strips: readonly StripFigure[]): BlockAnalysis {
  const analysis = blockAnalysis(strips);
  if (analysis.kind === 'insufficient') throw new Error(analysis.reason);
  return analysis.value;
}

function milliseconds(work: () => unknown): number {
  const began = performance.now();
  work();
  return performance.now() - began;
}

/** Three rounds warm up and are not counted, as a server that has answered before is. */
function timed(work: (round: number) => unknown): number[] {
  for (let round = -3; round < 0; round += 1) work(round);
  return Array.from({ length: rounds }, (_, round) => milliseconds(() => work(round)));
}

function told(what: string, times: readonly number[], aim: number | null): string {
  const middle = median(times);
  const spread = `${Math.min(...times).toFixed(3)} to ${Math.max(...times).toFixed(3)}`;
  const verdict = aim === null ? '' : ` (aim: at most ${aim} ms; ${middle <= aim ? 'held' : 'MISSED'})`;
  return `  ${what}: median ${middle.toFixed(3)} ms, ${spread}${verdict}`;
}

const twelveByEight = trial(12, 8);
const analysis = analysed(twelveByEight);
const pairs = analysis.differences;
const freshPairs: number[] = [];
const cachedPairs: number[] = [];
// Degrees of freedom not asked before, so that nothing is remembered: one pair pays for table and quantile of its trial.
for (let round = 0; round < rounds; round += 1) {
  const unasked = 13 + 2 * round;
  const pair = pairs[round % pairs.length];
  if (!pair) throw new Error('no pair');
  freshPairs.push(milliseconds(() => tukeyPair(pair, 12, unasked)));
  cachedPairs.push(milliseconds(() => tukeyPair(pair, 12, unasked)));
}
const fourByFour = trial(4, 4);
// A block of one setting twice breaks the symmetry and adds nothing, so that all 331,776 are dealt out.
const noSymmetry = [
  ...fourByFour,
  { block: 'x', setting: '0', figure: 10 },
  { block: 'x', setting: '0', figure: 11 },
];

const lines = [
  `Comparison of settings, ${rounds} rounds:`,
  told(
    'block analysis, 12 settings in 8 blocks',
    timed(() => blockAnalysis(twelveByEight)),
    5,
  ),
  told('Tukey, a pair of 12 settings at degrees of freedom not asked before', freshPairs, 2),
  told('Tukey, the same pair again', cachedPairs, 2),
  told(
    'all 66 pairs of that trial',
    timed(() => pairs.map((pair) => tukeyPair(pair, 12, 77))),
    2 * pairs.length,
  ),
  told(
    '331,776 arrangements, 4 settings in 4 blocks, by symmetry',
    timed(() => randomisationTest(fourByFour, 1)),
    50,
  ),
  told(
    '331,776 arrangements, each of them dealt',
    timed(() => randomisationTest(noSymmetry, 1)),
    50,
  ),
  told(
    '1,679,616 arrangements, 3 settings in 8 blocks',
    timed(() => randomisationTest(trial(3, 8), 1)),
    null,
  ),
  told(
    '100,000 sampled arrangements, 12 settings in 8 blocks',
    timed(() => randomisationTest(twelveByEight, 1)),
    null,
  ),
];
process.stdout.write(`${lines.join('\n')}\n`);
