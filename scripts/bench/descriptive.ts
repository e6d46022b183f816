// The descriptive figures of 100,000 row samples: packed arrays, a hand-fused loop, records, and R where it is there.
import { spawn, spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import { emergenceCurve } from '../../lib/agronomy/emergence-curve';
import { kachmanSmith } from '../../lib/agronomy/kachman-smith';
import { packRows } from '../../lib/agronomy/pack-rows';
import { packedFigures } from '../../lib/agronomy/packed-figures';
import type { PackedFigures, PackedRows } from '../../lib/agronomy/packed-rows';
import { spacingsInches, spacingVariation } from '../../lib/agronomy/spacing';
import { timingFigures } from '../../lib/agronomy/timing-figures';
import { fusedFigures } from './fused-figures';
import { simulatedRows, type SimulatedRows } from './simulated-rows';
import { median, ratioText } from './ratio';

const rowsAtOnce = 100_000;
const plants = 30;
const visits = 8;
const rounds = 9;

const names = ['plantsPerAcre', 'spacingInchesMean', 'spacingInchesSd', 'spacingCv', 'multiplesShare', 'singlesShare', 'missesShare', 'daysTo10', 'daysTo50', 'daysTo90', 'spreadDays'] as const;

/** The same by one record at a time, with outcomes and reasons: what a page of one planting does. */
function oneByOne({ records }: SimulatedRows): number {
  let told = 0;
  for (const row of records) {
    const spacings = spacingsInches(row.placesInches);
    const variation = spacingVariation(spacings);
    const placement = kachmanSmith([{ spacingsInches: spacings, theoreticalSpacingInches: row.theoreticalSpacingInches }]);
    const timing = timingFigures(emergenceCurve(row.visits));
    if (variation.kind === 'value' && placement.kind === 'value' && timing.spreadDays.kind === 'value') told += 1;
  }
  return told;
}

/** Both sides collect their garbage before a pass and outside the clock: fresh pages cost more here than the figures. */
function timed(work: () => unknown): number {
  globalThis.gc?.();
  const began = performance.now();
  work();
  return performance.now() - began;
}

function largestDifference(one: Record<(typeof names)[number], ArrayLike<number>>, other: (name: (typeof names)[number], row: number) => number): number {
  let largest = 0;
  for (const name of names) for (let row = 0; row < rowsAtOnce; row += 1) largest = Math.max(largest, Math.abs((one[name][row] ?? 0) - other(name, row)) / Math.max(1, Math.abs(one[name][row] ?? 0)));
  return largest;
}

function startR(folder: string, rows: PackedRows) {
  if (spawnSync('Rscript', ['--version']).error) return undefined;
  const [input, output] = [join(folder, 'rows.bin'), join(folder, 'figures.bin')];
  const parts = [rows.placesInches, rows.visitDays.subarray(0, visits), rows.plantsUp, rows.plantsHeld, rows.areaAcres, rows.theoreticalSpacingInches];
  writeFileSync(input, Buffer.concat(parts.map((part) => Buffer.from(part.buffer, part.byteOffset, part.byteLength))));
  const r = spawn('Rscript', ['scripts/bench/descriptive.R', input, output, String(rowsAtOnce), String(plants), String(visits)], { stdio: ['pipe', 'pipe', 'inherit'] });
  const lines = createInterface({ input: r.stdout })[Symbol.asyncIterator]();
  return {
    pass: async () => {
      r.stdin.write('go\n');
      return Number((await lines.next()).value);
    },
    end: async () => {
      const ended = new Promise((resolve) => r.on('close', resolve));
      r.stdin.write('end\n');
      await ended;
      const bytes = readFileSync(output);
      return new Float64Array(bytes.buffer, bytes.byteOffset, bytes.byteLength / 8);
    },
  };
}

const rows = simulatedRows({ rows: rowsAtOnce, plants, visits, seed: 20_260_507 });
const folder = mkdtempSync(join(tmpdir(), 'rowrise-bench-'));
try {
  const r = startR(folder, rows.packed);
  const times = { packed: [] as number[], fused: [] as number[], records: [] as number[], oneByOne: [] as number[], r: [] as number[] };
  let figures: PackedFigures = packedFigures(rows.packed);
  let fused = fusedFigures(rows.packed);
  // Two rounds warm every side up and are not counted.
  for (let round = -2; round < rounds; round += 1) {
    const took = {
      packed: timed(() => (figures = packedFigures(rows.packed))),
      fused: timed(() => (fused = fusedFigures(rows.packed))),
      records: timed(() => packedFigures(packRows(rows.records))),
      oneByOne: timed(() => oneByOne(rows)),
      r: r ? await r.pass() : Number.NaN,
    };
    if (round >= 0) for (const side of ['packed', 'fused', 'records', 'oneByOne', 'r'] as const) times[side].push(took[side]);
  }
  const say = (line: string) => process.stdout.write(`${line}\n`);
  say(`Descriptive figures of ${rowsAtOnce.toLocaleString('en-US')} row samples, ${plants} plants and ${visits} counts each, ${rounds} rounds in turn:`);
  say(`  packed arrays ${median(times.packed).toFixed(1)} ms, hand-fused loop ${median(times.fused).toFixed(1)} ms, records packed first ${median(times.records).toFixed(1)} ms, one at a time with reasons ${median(times.oneByOne).toFixed(1)} ms${r ? `, R ${median(times.r).toFixed(1)} ms` : ''}`);
  say(`  packed against the hand-fused loop: ${ratioText(times.packed, times.fused)} (aim: at most 1.5)`);
  say(`  largest relative difference from the hand-fused loop: ${largestDifference(figures, (name, row) => fused[name][row] ?? 0).toExponential(1)}`);
  if (r) {
    const theirs = await r.end();
    say(`  R against packed arrays: ${ratioText(times.r, times.packed)} (aim: at least 3)`);
    say(`  R against records: ${ratioText(times.r, times.records)} (aim: at least 1)`);
    say(`  largest relative difference from R: ${largestDifference(figures, (name, row) => theirs[names.indexOf(name) * rowsAtOnce + row] ?? 0).toExponential(1)}`);
  } else say('  R is not on this machine, so its ratios are left out.');
} finally {
  rmSync(folder, { recursive: true, force: true });
}
