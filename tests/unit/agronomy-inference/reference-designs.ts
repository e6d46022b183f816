import { readFileSync } from 'node:fs';
import type { StripFigure } from '../../../lib/agronomy/inference/block-analysis';
import type { Outcome } from '../../../lib/agronomy/outcome';

export type ReferenceDesign = {
  input: { y: number; setting: string; block: string }[];
  expected: {
    anova: { F: number; p: number };
    mse: number;
    dfe: number;
    means: { setting: string[]; mean: number[]; se: number[] };
    pairs: {
      pair: string[] | string;
      difference: number[] | number;
      se: number[] | number;
      lower: number[] | number;
      upper: number[] | number;
      p_unadjusted: number[] | number;
      p_tukey: number[] | number;
      p_holm: number[] | number;
    };
    randomisation?: { arrangements: number; as_extreme: number; p: number };
  };
};

/** R 4.2.2 and emmeans 1.8.4 on data that R carries; see tests/reference/inference-sources.md. */
export function referenceJson<T>(file: string): T {
  return JSON.parse(readFileSync(new URL(`../../reference/${file}`, import.meta.url), 'utf8')) as T;
}

export function stripsOf(design: ReferenceDesign): StripFigure[] {
  return design.input.map(({ y, setting, block }) => ({ figure: y, setting, block }));
}

export function answered<T>(outcome: Outcome<T>): T {
  if (outcome.kind !== 'value') throw new Error(`insufficient: ${outcome.reason}`);
  return outcome.value;
}
