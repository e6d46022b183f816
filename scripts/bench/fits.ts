// How long a smooth emergence curve takes: one shape, and all three with the choice between them.
import { bestEmergenceFit, emergenceFit } from '../../lib/agronomy/inference/emergence-fit';
import { randomStream } from '../../lib/agronomy/random';
import type { SeenBetween } from '../../lib/agronomy/turnbull';
import { median } from './ratio';

const stream = randomStream(20_260_507);
const rounds = 31;

/** The pooled counts of a strip: three row samples, twelve visits, about ninety plants. */
const strips = Array.from({ length: 48 }, (): SeenBetween[] =>
  Array.from({ length: 12 }, (_, visit) => ({ afterDays: 7 + visit, byDays: 8 + visit, plants: Math.round(28 * Math.exp(-((visit - 3.5) ** 2) / 5) + stream.nextUnit() * 3) })),
);

function timed(work: (seen: SeenBetween[]) => unknown): number[] {
  for (const seen of strips.slice(0, 10)) work(seen);
  return Array.from({ length: rounds }, () => {
    const began = performance.now();
    for (const seen of strips) work(seen);
    return (performance.now() - began) / strips.length;
  });
}

const say = (what: string, times: number[]) =>
  process.stdout.write(`  ${what}: ${median(times).toFixed(2)} ms (${Math.min(...times).toFixed(2)} to ${Math.max(...times).toFixed(2)})\n`);

process.stdout.write(`Smooth curves of the pooled counts of a strip, ${strips.length} strips, ${rounds} rounds, per strip:\n`);
say('log-normal', timed((seen) => emergenceFit(seen, 'log-normal')));
say('log-normal with a final share', timed((seen) => emergenceFit([...seen, { afterDays: 19, byDays: null, plants: 10 }], 'log-normal', 'seeds-with-final-share')));
say('all three shapes and the choice by AIC', timed((seen) => bestEmergenceFit(seen)));
